/** "Fri 23 Oct, 17:00" on the wall of a zone. */
export function wallWords(iso: string, zone: string): string {
  const parts = new Intl.DateTimeFormat('en-GB', { weekday: 'short', day: 'numeric', month: 'short', hour: '2-digit', minute: '2-digit', hour12: false, timeZone: zone }).formatToParts(new Date(iso))
  const part = (type: string) => parts.find(entry => entry.type === type)?.value ?? ''
  return `${part('weekday')} ${part('day')} ${part('month')}, ${part('hour')}:${part('minute')}`
}

/** A wall time a number of days later, at the given time of day, for the first proposal in a form. */
export function proposeLocal(now: Date, zone: string, days: number, time: string): string {
  const parts = new Intl.DateTimeFormat('en-CA', { year: 'numeric', month: '2-digit', day: '2-digit', timeZone: zone }).format(new Date(now.getTime() + days * 86_400_000))
  return `${parts}T${time}`
}
