/** "Wed 14 Oct, 23:00" on the wall of a zone. The locale is fixed, so that server and browser write the same. */
export function dateInZone(iso: string, zone: string, withSeconds = false): string {
  const parts = new Intl.DateTimeFormat('en-US', {
    timeZone: zone, weekday: 'short', day: 'numeric', month: 'short', hour: '2-digit', minute: '2-digit', hourCycle: 'h23', ...(withSeconds ? { second: '2-digit' } : {}),
  }).formatToParts(new Date(iso))
  const of = (type: Intl.DateTimeFormatPartTypes) => parts.find(part => part.type === type)?.value ?? ''
  return `${of('weekday')} ${of('day')} ${of('month')}, ${of('hour')}:${of('minute')}${withSeconds ? `:${of('second')}` : ''}`
}

/** "7 Oct 2026" on the calendar of a zone. */
export function dayInZone(iso: string, zone: string): string {
  const parts = new Intl.DateTimeFormat('en-US', { timeZone: zone, day: 'numeric', month: 'short', year: 'numeric' }).formatToParts(new Date(iso))
  const of = (type: Intl.DateTimeFormatPartTypes) => parts.find(part => part.type === type)?.value ?? ''
  return `${of('day')} ${of('month')} ${of('year')}`
}

/** "10:41" on the wall of a zone. */
export function clockInZone(iso: string, zone: string): string {
  return new Intl.DateTimeFormat('en-GB', { timeZone: zone, hour: '2-digit', minute: '2-digit', hourCycle: 'h23' }).format(new Date(iso))
}

/** What is left, in the two largest units that say enough: "2 d 12 h", "3 h 5 min", "12 min", "under a minute". */
export function leftWords(milliseconds: number): string {
  if (milliseconds <= 0) return 'nothing'
  const minutes = Math.floor(milliseconds / 60_000)
  if (minutes < 1) return 'under a minute'
  const [days, hours, rest] = [Math.floor(minutes / 1440), Math.floor(minutes / 60) % 24, minutes % 60]
  if (days > 0) return `${days} d ${hours} h`
  return hours > 0 ? `${hours} h ${rest} min` : `${rest} min`
}
