import type { PlacesReply } from '#shared/schemas/runningHead'

/** The counts beside the places of a course and its teaching week. Asked again with each page: they follow what was just done. */
export function usePlaces(courseId: Ref<string | null>) {
  const ask = useRequestFetch()
  const route = useRoute()
  // A path of type string and a named reply: inferring one from all routes is more than the compiler bears.
  const path = computed((): string => `/api/courses/${courseId.value}/places`)
  return useAsyncData('places', async () => courseId.value ? ask<PlacesReply>(path.value) : null, { watch: [() => route.path], dedupe: 'defer' })
}
