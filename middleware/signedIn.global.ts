/** Pages are for people who are signed in, unless a page says `definePageMeta({ isPublic: true })`. */
export default defineNuxtRouteMiddleware((to) => {
  if (useError().value) return // the error page runs middleware again, without a session
  if (to.meta.isPublic || to.matched.length === 0) return
  const { status } = useAuth()
  if (status.value !== 'authenticated') return navigateTo({ path: '/sign-in', query: { to: to.fullPath } })
})
