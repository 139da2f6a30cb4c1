import type { Output } from '#shared/calc/types'
import { showMargin, showValue } from '#shared/units/display'
import { isUnit, unitFits } from '#shared/units/units'
import type { ReadTied } from '~/editor/views/tied-view'

interface Sources {
  output: (calcId: string, key: string) => Output | null
  name: (calcId: string) => string
}

/** What a tied value reads: the output in the unit chosen for it, or a plain sign that it is gone. */
export function makeReadTied({ output, name }: Sources): ReadTied {
  return (calcId, key, unit) => {
    const found = output(calcId, key)
    if (!found) return { number: '?missing', unit: '', label: 'Its calculation no longer gives this value', missing: true }
    const shownIn = unit !== null && isUnit(unit) && unitFits(unit, found.dimension) ? unit : found.unit
    const number = found.dimension === 'margin' ? showMargin(found.value) : showValue(found.value, found.dimension, shownIn)
    const gap = shownIn === '' || shownIn === '°' ? '' : '\u2009'
    return { number, unit: `${gap}${shownIn}`, label: `${found.label}, ${name(calcId)}`, missing: false }
  }
}
