/** The counts beside the places of a course and its teaching week. Asked again with each page: they follow what was just done. */
export function usePlaces(courseId: Ref<string | null>) {
  const ask = useRequestFetch()
  const route = useRoute()
  return useAsyncData('places', async () => courseId.value ? ask(`/api/courses/${courseId.value}/places`) : null, { watch: [() => route.path], dedupe: 'defer' })
}
