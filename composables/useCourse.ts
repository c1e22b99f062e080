/** The course that the address names, as the person who is signed in belongs to it; null outside a course. */
export function useCourse() {
  const route = useRoute()
  const { data: self } = useSelf()
  const courseId = computed(() => typeof route.params.courseId === 'string' ? route.params.courseId : null)
  const course = computed(() => self.value?.courses.find(one => one.id === courseId.value) ?? null)
  const role = computed(() => course.value?.role ?? null)
  const isStaff = computed(() => role.value !== null && role.value !== 'student')
  return { courseId, course, role, isStaff }
}
