import { onBeforeUnmount, onMounted, ref, type Ref } from 'vue'

/** Width of an element in CSS pixels, kept as it changes; `fallback` until it is laid out. */
export function useWidth(element: Ref<HTMLElement | null>, fallback: number): Ref<number> {
  const width = ref(fallback)
  const observer = new ResizeObserver(([entry]) => {
    const seen = entry?.contentRect.width ?? 0
    if (seen > 0) width.value = Math.round(seen)
  })
  onMounted(() => {
    if (element.value) observer.observe(element.value)
  })
  onBeforeUnmount(() => observer.disconnect())
  return width
}
