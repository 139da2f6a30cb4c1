import { useEventListener, useResizeObserver } from '@vueuse/core'
import { nextTick, onMounted, shallowRef, watch, type Ref } from 'vue'
import { placeNotes, type Placed } from '~/editor/place-notes'
import { anchorsOf, anchorsOn, type SideItem } from '~/editor/side-items'

const LINE = 9

/** Heights of the notes beside the text, and their order down the page; measured again when anything moves. */
export function useSideLayout(items: Ref<readonly SideItem[]>, sheet: Ref<HTMLElement | null>, column: Ref<HTMLElement | null>, also: () => unknown) {
  const placed = shallowRef(new Map<string, Placed>())
  const order = shallowRef<string[]>([])
  let frame = 0

  function anchorY(item: SideItem, anchors: ReadonlyMap<string, HTMLElement>, top: number): number {
    if (item.kind === 'remark' && item.remark.anchorState === 'orphaned') return 0
    for (const anchor of anchorsOf(item)) {
      const element = anchors.get(anchor)
      const rect = element?.getClientRects()[0]
      if (!element || !rect) continue
      const inLine = element.tagName === 'SPAN'
      return (inLine ? rect.bottom - 1 : rect.top + 14) - top - LINE
    }
    return 0
  }
  function measure() {
    frame = 0
    const root = sheet.value
    if (!root) return
    const top = root.getBoundingClientRect().top
    const anchors = anchorsOn(root)
    const heights = new Map([...column.value?.querySelectorAll<HTMLElement>('[data-note]') ?? []].map(note => [note.dataset.note ?? '', note.offsetHeight]))
    const wanted = items.value.map(item => ({ id: item.id, y: anchorY(item, anchors, top), height: heights.get(item.id) ?? 40 })).sort((a, b) => a.y - b.y)
    const taken = [...root.querySelectorAll('.oc')].map((element) => {
      const rect = element.getBoundingClientRect()
      return { top: rect.top - top, bottom: rect.bottom - top }
    })
    const head = column.value?.querySelector<HTMLElement>('.mghead')?.offsetHeight ?? 0
    placed.value = new Map(placeNotes(wanted, taken, 14, head + 14).map(each => [each.id, each]))
    order.value = wanted.map(each => each.id)
  }
  function measureSoon() {
    if (!frame) frame = requestAnimationFrame(measure)
  }
  watch([items, also], () => void nextTick(measureSoon), { flush: 'post' })
  useResizeObserver(sheet, measureSoon)
  useEventListener('resize', measureSoon)
  onMounted(() => void document.fonts.ready.then(measureSoon))
  return { placed, order, measureSoon }
}
