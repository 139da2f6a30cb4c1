export interface Target { calcId?: string, blockId?: string, remarkId?: string, sectionKey?: string, mark?: string }

/** Where something of the note stands on the screen. */
export function elementOf(target: Target): HTMLElement | null {
  const find = (selector: string) => document.querySelector<HTMLElement>(selector)
  if (target.mark) return find(`[data-mark="${CSS.escape(target.mark)}"]`)
  if (target.remarkId) return find(`[data-remark="${CSS.escape(target.remarkId)}"]`) ?? find(`[data-mark="${CSS.escape(target.remarkId)}"]`)
  if (target.calcId) return find(`#calc-${CSS.escape(target.calcId)}`)
  if (target.blockId) return find(`[data-id="${CSS.escape(target.blockId)}"]`)
  return target.sectionKey ? find(`#section-${CSS.escape(target.sectionKey)}`) : null
}

/** Brings it into sight and gives it the focus, so that the keyboard goes on from there. */
export function jumpTo(target: Target) {
  const element = elementOf(target)
  if (!element) return
  const calm = window.matchMedia('(prefers-reduced-motion: reduce)').matches
  element.scrollIntoView({ block: 'center', behavior: calm ? 'auto' : 'smooth' })
  const first = element.matches('button, a, input') ? element : element.querySelector<HTMLElement>('button, a, input, textarea')
  if (first) first.focus({ preventScroll: true })
}
