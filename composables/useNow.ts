/**
 * The time by the server's clock, anew each half minute. `told` is the server's time when the page was made:
 * a device whose clock is wrong still counts down rightly, and server and browser first draw the same.
 */
export function useNow(told: () => string | undefined) {
  const start = computed(() => Date.parse(told() ?? '') || 0)
  const passed = ref(0)
  let timer: ReturnType<typeof setInterval> | undefined
  onMounted(() => {
    const since = performance.now()
    timer = setInterval(() => { passed.value = performance.now() - since }, 30_000)
  })
  onBeforeUnmount(() => clearInterval(timer))
  return computed(() => start.value + passed.value)
}
