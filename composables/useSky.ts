export type Sky = 'day' | 'night' | 'system'

/** Day, night, or as the system has it. Kept in a cookie, so that the server draws the right one at once. */
export function useSky() {
  const kept = useCookie<Sky>('sky', { default: () => 'system', maxAge: 365 * 86_400, sameSite: 'lax', path: '/' })
  const sky = computed<Sky>({
    get: () => kept.value === 'day' || kept.value === 'night' ? kept.value : 'system',
    set: (value) => { kept.value = value },
  })
  return { sky }
}
