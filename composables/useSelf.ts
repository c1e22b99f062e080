/** Who is signed in, with courses and roles. Asked once a page; null when nobody is. */
export function useSelf() {
  return useFetch('/api/me', { key: 'self', dedupe: 'defer' })
}

export type Self = NonNullable<Awaited<ReturnType<typeof useSelf>>['data']['value']>
export type SelfCourse = Self['courses'][number]
