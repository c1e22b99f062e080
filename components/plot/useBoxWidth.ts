import { onBeforeUnmount, onMounted, ref, type Ref } from 'vue'

/** The width of an element, watched: figures are drawn at it, never scaled. Before it is known, a usual one. */
export function useBoxWidth(box: Ref<HTMLElement | undefined>, usual: number): Ref<number> {
  const width = ref(usual)
  let observer: ResizeObserver | undefined
  onMounted(() => {
    if (!box.value) return
    width.value = box.value.clientWidth || usual
    observer = new ResizeObserver(([entry]) => { if (entry) width.value = Math.max(220, Math.floor(entry.contentRect.width)) })
    observer.observe(box.value)
  })
  onBeforeUnmount(() => observer?.disconnect())
  return width
}
