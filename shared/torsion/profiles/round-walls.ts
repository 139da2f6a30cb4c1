/** Profiles of one curved wall: the circular arc and the slit tube, both about the origin. mm, rad. */
import type { Point } from '#shared/torsion/section'
import type { ConversionLine, Moduli } from '#shared/torsion/profiles/profile'
import type { Converted, Of } from '#shared/torsion/profiles/chains'
import { refusal } from '#shared/torsion/section'
import { midRadius } from '#shared/torsion/profiles/conversion'
import { mm } from '#shared/torsion/profiles/walls-of-profile'

function ring(line: ConversionLine, name: string, t: number, start: number, sweep: number, moduli: Moduli): Converted {
  const R = line.value
  if (!(R > t / 2)) return refusal(`A mid-line radius of ${mm(R)} leaves no inner face beside a thickness of ${mm(t)}. Give a greater radius, or a solid bar.`, line.terms[0]?.symbol)
  const at = (angle: number): Point => ({ x: R * Math.cos(angle), y: R * Math.sin(angle) })
  const [from, to] = [at(start), sweep === 2 * Math.PI ? at(start) : at(start + sweep)]
  return {
    lines: [line],
    drawn: {
      ok: true, names: { a: name },
      section: {
        nodes: [{ id: '1', ...from }, { id: '2', ...to }],
        walls: [{ id: 'a', from: '1', to: '2', t, ...moduli, arc: { radius: R, sweep, startDirection: start + Math.PI / 2 } }], junctions: [],
      },
    },
  }
}

/** Symmetric about the x-axis, open to the left. */
export function arcWall(p: Of<'arc'>, moduli: Moduli): Converted {
  if (!(p.angle < 2 * Math.PI)) return refusal('An arc sweeps less than a full circle. Use the slit tube for a full circle with an open seam.', '\\alpha')
  return ring(midRadius({ symbol: 'R', factor: 1, value: p.radius }, p.measured, p.t), 'arc', p.t, -p.angle / 2, p.angle, moduli)
}

/** The seam to the right, at y = 0. */
export const slitTubeWall = (p: Of<'slit tube'>, moduli: Moduli): Converted =>
  ring(midRadius({ symbol: 'D', factor: 0.5, value: p.diameter }, p.measured, p.t), 'tube', p.t, 0, 2 * Math.PI, moduli)
