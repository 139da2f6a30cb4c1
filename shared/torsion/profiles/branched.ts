/** Profiles with a flange on both sides of a web: tee, I, J. mm. */
import type { ConversionLine, Moduli } from '#shared/torsion/profiles/profile'
import type { Converted, Of } from '#shared/torsion/profiles/chains'
import { midLength } from '#shared/torsion/profiles/conversion'
import { drawn, nothingLeft } from '#shared/torsion/profiles/walls-of-profile'

const value = (line: ConversionLine | undefined): number => line?.value ?? 0

/** A flange on both sides of a web is measured from edge to edge, whatever the rest is measured on. */
const whole = (of: string, symbol: string, given: number): ConversionLine => midLength(of, { symbol, value: given }, 'mid-line', [])

/** Flange across the origin, stem below it. */
export function teeWalls(p: Of<'tee'>, moduli: Moduli): Converted {
  const lines = [whole('flange', 'b', p.flange), midLength('stem', { symbol: 'h', value: p.height }, p.measured, [{ symbol: 't_f', t: p.tFlange }])]
  const [half, stem] = [value(lines[0]) / 2, value(lines[1])]
  const points = [{ x: -half, y: 0 }, { x: 0, y: 0 }, { x: half, y: 0 }, { x: 0, y: -stem }]
  const links = [{ name: 'left half of the flange', t: p.tFlange, from: 0, to: 1 }, { name: 'right half of the flange', t: p.tFlange, from: 1, to: 2 }, { name: 'stem', t: p.tStem, from: 1, to: 3 }]
  return nothingLeft(lines) ?? { lines, drawn: drawn(points, links, ['2'], p, moduli) }
}

/** Web upright from the origin at the middle of the lower flange. */
export function iWalls(p: Of<'I'>, moduli: Moduli): Converted {
  const lines = [
    whole('lower flange', 'b_l', p.lower), midLength('web', { symbol: 'h', value: p.height }, p.measured, [{ symbol: 't_l', t: p.tLower }, { symbol: 't_u', t: p.tUpper }]),
    whole('upper flange', 'b_u', p.upper),
  ]
  const [low, web, high] = [value(lines[0]) / 2, value(lines[1]), value(lines[2]) / 2]
  const points = [{ x: -low, y: 0 }, { x: 0, y: 0 }, { x: low, y: 0 }, { x: 0, y: web }, { x: -high, y: web }, { x: high, y: web }]
  const links = [
    { name: 'left half of the lower flange', t: p.tLower, from: 0, to: 1 }, { name: 'right half of the lower flange', t: p.tLower, from: 1, to: 2 },
    { name: 'web', t: p.tWeb, from: 1, to: 3 },
    { name: 'left half of the upper flange', t: p.tUpper, from: 4, to: 3 }, { name: 'right half of the upper flange', t: p.tUpper, from: 3, to: 5 },
  ]
  return nothingLeft(lines) ?? { lines, drawn: drawn(points, links, ['2', '4'], p, moduli) }
}

/** Web upright from the origin at the middle of the base; the cap to the right. */
export function jWalls(p: Of<'J'>, moduli: Moduli): Converted {
  const lines = [
    whole('base', 'b', p.base), midLength('web', { symbol: 'h', value: p.height }, p.measured, [{ symbol: 't_b', t: p.tBase }, { symbol: 't_c', t: p.tCap }]),
    midLength('cap', { symbol: 'c', value: p.cap }, p.measured, [{ symbol: 't_w', t: p.tWeb }]),
  ]
  const [half, web, cap] = [value(lines[0]) / 2, value(lines[1]), value(lines[2])]
  const points = [{ x: -half, y: 0 }, { x: 0, y: 0 }, { x: half, y: 0 }, { x: 0, y: web }, { x: cap, y: web }]
  const links = [
    { name: 'left half of the base', t: p.tBase, from: 0, to: 1 }, { name: 'right half of the base', t: p.tBase, from: 1, to: 2 },
    { name: 'web', t: p.tWeb, from: 1, to: 3 }, { name: 'cap', t: p.tCap, from: 3, to: 4 },
  ]
  return nothingLeft(lines) ?? { lines, drawn: drawn(points, links, ['2', '4'], p, moduli) }
}
