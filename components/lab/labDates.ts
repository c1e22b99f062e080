/** A wall time a number of days later, at the given time of day, for the first proposal in a form. */
export function proposeLocal(now: Date, zone: string, days: number, time: string): string {
  const parts = new Intl.DateTimeFormat('en-CA', { year: 'numeric', month: '2-digit', day: '2-digit', timeZone: zone }).format(new Date(now.getTime() + days * 86_400_000))
  return `${parts}T${time}`
}
