/** Profiles that are one chain of walls: angle, channel, zed, hat, lipped channel. mm, rad. */
import type { Refusal } from '#shared/torsion/section'
import type { ConversionLine, ConversionTerm, MeasuredOn, Moduli, Profile } from '#shared/torsion/profiles/profile'
import type { Drawn } from '#shared/torsion/profiles/walls-of-profile'
import { refusal } from '#shared/torsion/section'
import { conversion, cornerReach, midLength } from '#shared/torsion/profiles/conversion'
import { chainOfWalls, nothingLeft } from '#shared/torsion/profiles/walls-of-profile'

export type Of<Shape extends Profile['shape']> = Extract<Profile, { shape: Shape }>
export type Converted = { readonly drawn: Drawn, readonly lines: readonly ConversionLine[] } | Refusal

const quarter = Math.PI / 2
const value = (line: ConversionLine | undefined): number => line?.value ?? 0

/** The lying leg to the right of the corner, the upright one above it. */
export function angleWalls(p: Of<'angle'>, moduli: Moduli): Converted {
  const lines = [
    midLength('lying leg', { symbol: 'b', value: p.width }, p.measured, [{ symbol: 't_h', t: p.tHeight }]),
    midLength('upright leg', { symbol: 'h', value: p.height }, p.measured, [{ symbol: 't_b', t: p.tWidth }]),
  ]
  const [lying, upright] = [{ name: 'lying leg', length: value(lines[0]), t: p.tWidth }, { name: 'upright leg', length: value(lines[1]), t: p.tHeight }]
  return nothingLeft(lines) ?? { lines, drawn: chainOfWalls([lying, upright], Math.PI, [-quarter], 1, p, moduli) }
}

/** Web upright from the origin; the upper flange to the right, the lower one to the right (channel) or left (zed). */
export function channelWalls(p: Of<'channel' | 'zed'>, moduli: Moduli): Converted {
  const web = { symbol: 't_w', t: p.tWeb }
  const lines = [
    midLength('lower flange', { symbol: 'b_l', value: p.lower }, p.measured, [web]),
    midLength('web', { symbol: 'h', value: p.height }, p.measured, [{ symbol: 't_l', t: p.tLower }, { symbol: 't_u', t: p.tUpper }]),
    midLength('upper flange', { symbol: 'b_u', value: p.upper }, p.measured, [web]),
  ]
  const walls = [
    { name: 'lower flange', length: value(lines[0]), t: p.tLower }, { name: 'web', length: value(lines[1]), t: p.tWeb }, { name: 'upper flange', length: value(lines[2]), t: p.tUpper },
  ]
  const [start, turn] = p.shape === 'channel' ? [Math.PI, -quarter] : [0, quarter]
  return nothingLeft(lines) ?? { lines, drawn: chainOfWalls(walls, start, [turn, -quarter], 1, p, moduli) }
}

/** Lips turned in; web upright from the origin. */
export function lippedChannelWalls(p: Of<'lipped channel'>, moduli: Moduli): Converted {
  const [web, flange, lip] = [{ symbol: 't_w', t: p.tWeb }, { symbol: 't_f', t: p.tFlange }, { symbol: 't_c', t: p.tLip }]
  const lines = [
    midLength('lip', { symbol: 'c', value: p.lip }, p.measured, [flange]),
    midLength('flange', { symbol: 'b', value: p.flange }, p.measured, [web, lip]),
    midLength('web', { symbol: 'h', value: p.height }, p.measured, [flange, flange]),
  ]
  const of = (name: string, index: number, t: number) => ({ name, length: value(lines[index]), t })
  const walls = [of('lower lip', 0, p.tLip), of('lower flange', 1, p.tFlange), of('web', 2, p.tWeb), of('upper flange', 1, p.tFlange), of('upper lip', 0, p.tLip)]
  const none = nothingLeft(lines)
  if (none) return none
  if (2 * value(lines[0]) >= value(lines[2])) return refusal(`The two lips, ${Number(value(lines[0]).toPrecision(4))} mm each on the mid-line, close the section of ${Number(value(lines[2]).toPrecision(4))} mm. Shorten the lips, or use a closed section.`, 'c')
  return { lines, drawn: chainOfWalls(walls, -quarter, [-quarter, -quarter, -quarter, -quarter], 2, p, moduli) }
}

/** Largest lean of a web: beyond it the webs lie down. */
const mostLean = 75 * Math.PI / 180

/** What a corner between a lying wall and a leaning web takes from or adds to the lying wall. */
function reachTerm(own: { symbol: string, t: number }, web: number, turn: number, measured: MeasuredOn, count: number): ConversionTerm[] {
  if (measured === 'mid-line') return []
  const symbol = `\\frac{t_w - ${own.symbol}\\cos\\theta}{2\\sin\\theta}`
  return [{ symbol, factor: (measured === 'outside' ? -1 : 1) * count, value: cornerReach(own.t, web, turn) }]
}

/** Brims on the base line, crown above; the origin at the foot of the left web. Widths go to the crossing of faces. */
export function hatWalls(p: Of<'hat'>, moduli: Moduli): Converted {
  if (!(p.lean >= 0 && p.lean < mostLean)) return refusal('The webs of a hat lean outwards by 0° to less than 75° from the upright. Use the wall table for other shapes.', '\\delta')
  const [brim, crown, theta] = [{ symbol: 't_b', t: p.tBrim }, { symbol: 't_c', t: p.tCrown }, quarter - p.lean]
  const upright = p.lean === 0
  const width = (of: string, symbol: string, given: number, own: { symbol: string, t: number }, count: number): ConversionLine => upright
    ? midLength(of, { symbol, value: given }, p.measured, Array.from({ length: count }, () => ({ symbol: 't_w', t: p.tWeb })))
    : conversion(of, `${symbol}_m`, [{ symbol, factor: 1, value: given }, ...reachTerm(own, p.tWeb, theta, p.measured, count)])
  const rise = midLength('height of the webs', { symbol: 'h', value: p.height }, p.measured, [brim, crown])
  const lines = [width('brim', 'b', p.brim, brim, 1), rise, width('crown', 'c', p.crown, crown, 2)]
  const web = conversion('web', 'L_w', [{ symbol: 'h_m/\\cos\\delta', factor: 1, value: rise.value / Math.cos(p.lean) }])
  const of = (name: string, length: number, t: number) => ({ name, length, t })
  const [flat, leaning, top] = [value(lines[0]), upright ? rise.value : web.value, value(lines[2])]
  const walls = [of('left brim', flat, p.tBrim), of('left web', leaning, p.tWeb), of('crown', top, p.tCrown), of('right web', leaning, p.tWeb), of('right brim', flat, p.tBrim)]
  return nothingLeft(lines) ?? { lines: upright ? lines : [...lines, web], drawn: chainOfWalls(walls, 0, [theta, -theta, -theta, theta], 1, p, moduli) }
}
