/** Laws that hold for every section: scaling, motion, order, splitting, superposition. */
import { describe, expect, it } from 'vitest'
import fc from 'fast-check'
import type { Junction, OpenSection, OpenWall, Point, SectionNode } from '#shared/torsion/section'
import { given } from '../../../reference/engine'
import { checkSection } from '#shared/torsion/section-check'
import { along } from '#shared/torsion/geometry'
import { torsionOfOpenSection } from '#shared/torsion/open-section'
import { respondToRate, respondToTorque } from '#shared/torsion/response'
import { sectorialProperties } from '#shared/torsion/sectorial'

const torsion = (section: OpenSection) => given(torsionOfOpenSection(section))
const properties = (section: OpenSection) => given(sectorialProperties(section))
const close = (actual: number, expected: number, scale = Math.abs(expected), tolerance = 1e-9): void => {
  expect(Math.abs(actual - expected), `${actual} against ${expected}`).toBeLessThanOrEqual(tolerance * Math.max(scale, 1e-300))
}

/** Γ of the mid-line, which vanishes as walls come to point at one place: to nine figures of what walls of that size could have. */
const closeGamma = (actual: OpenSection, expected: OpenSection, factor = 1): void => {
  const [one, other] = [properties(expected), properties(actual)]
  const size = one.weightedArea * one.rhoMax ** 4
  close(other.gammaPrimary, factor * one.gammaPrimary, factor * Math.max(one.gammaPrimary, 1e-6 * size), 1e-8)
  close(other.gammaSecondary, factor * one.gammaSecondary, undefined, 1e-8)
}

/** A chain of walls, some of them arcs tangent to the wall before, with a branch now and then; kept if it can be computed. */
const step = fc.record({
  length: fc.double({ min: 10, max: 60, noNaN: true }),
  turn: fc.double({ min: -1.9, max: 1.9, noNaN: true }),
  t: fc.constantFrom(0.8, 1, 1.6, 2, 3),
  /** Thickness at the end over that at the start. */
  taper: fc.constantFrom(1, 1, 0.6, 1.7),
  G: fc.constantFrom(26_900, 43_000),
  arc: fc.boolean(),
  branch: fc.boolean(),
})
type Step = typeof step extends fc.Arbitrary<infer S> ? S : never

function build(steps: readonly Step[]): OpenSection {
  const nodes: SectionNode[] = [{ id: 'n0', x: 0, y: 0 }]
  const walls: OpenWall[] = []
  let [at, heading, from]: [Point, number, string] = [{ x: 0, y: 0 }, 0, 'n0']
  for (const [index, { length, turn, t, taper, G, arc, branch }] of steps.entries()) {
    const id = `n${index + 1}`
    const sweep = arc ? turn : 0
    const chord = arc && turn !== 0 ? 2 * length / Math.abs(turn) * Math.sin(Math.abs(turn) / 2) : length
    const direction = heading + (arc ? turn / 2 : turn)
    const end = along(at, direction, chord)
    nodes.push({ id, ...end })
    walls.push({ id: `w${index}`, from, to: id, t, G, E: G * 2.64, ...(taper === 1 ? {} : { tEnd: t * taper }), ...(sweep !== 0 ? { arc: { radius: length / Math.abs(turn), sweep } } : {}) })
    if (branch) {
      nodes.push({ id: `b${index}`, ...along(end, direction + Math.PI / 2, 12) })
      walls.push({ id: `v${index}`, from: id, to: `b${index}`, t: 1, G, E: G * 2.64 })
    }
    [at, heading, from] = [end, heading + turn, id]
  }
  return { nodes, walls, junctions: [] }
}
/** Walls nearly on one line have a shear centre that any rounding moves: laws to nine figures cannot be asked of them. */
function spread(section: OpenSection): boolean {
  const { Ixx, Iyy, Ixy } = properties(section)
  return Ixx * Iyy - Ixy * Ixy > 1e-3 * (Ixx + Iyy) ** 2
}
const sections = fc.array(step, { minLength: 2, maxLength: 6 }).map(build).filter(section => checkSection(section).ok && spread(section))
const runs = { numRuns: 1000, seed: 20_261_012 }

const move = (section: OpenSection, by: (point: Point) => Point): OpenSection => ({ ...section, nodes: section.nodes.map(node => ({ id: node.id, ...by(node) })) })
const scale = (section: OpenSection, by: number): OpenSection => ({
  nodes: section.nodes.map(({ id, x, y }) => ({ id, x: by * x, y: by * y })),
  walls: section.walls.map(wall => ({ ...wall, t: by * wall.t, ...(wall.tEnd === undefined ? {} : { tEnd: by * wall.tEnd }), ...(wall.arc ? { arc: { ...wall.arc, radius: by * wall.arc.radius } } : {}) })),
  junctions: section.junctions.map(junction => ({ ...junction, radius: by * junction.radius })),
})
const reversed = (wall: OpenWall): OpenWall => ({ ...wall, from: wall.to, to: wall.from, ...(wall.tEnd === undefined ? {} : { t: wall.tEnd, tEnd: wall.t }), ...(wall.arc ? { arc: { ...wall.arc, sweep: -wall.arc.sweep } } : {}) })

describe('laws of the open section', () => {
  it('scales: GJ with λ⁴, Γ with λ⁶, stress at a given torque with λ⁻³', () => {
    fc.assert(fc.property(sections, fc.double({ min: 0.1, max: 20, noNaN: true }), (section, by) => {
      const [one, other] = [torsion(section), torsion(scale(section, by))]
      close(other.GJ, by ** 4 * one.GJ)
      closeGamma(scale(section, by), section, by ** 6)
      close(given(respondToTorque(other, 1e4)).tauMax, given(respondToTorque(one, 1e4)).tauMax / by ** 3)
    }), runs)
  })

  it('does not change when the section is moved and turned; the shear centre moves with it', () => {
    const shifts = fc.double({ min: -500, max: 500, noNaN: true })
    fc.assert(fc.property(sections, fc.double({ min: -3, max: 3, noNaN: true }), shifts, shifts, (section, angle, dx, dy) => {
      const by = ({ x, y }: Point): Point => ({ x: dx + x * Math.cos(angle) - y * Math.sin(angle), y: dy + x * Math.sin(angle) + y * Math.cos(angle) })
      const [one, other] = [properties(section), properties(move(section, by))]
      close(torsion(move(section, by)).GJ, torsion(section).GJ)
      closeGamma(move(section, by), section)
      close(other.In, one.In, undefined, 1e-7)
      const centre = by(one.shearCentre)
      close(other.shearCentre.x, centre.x, 1e3 + one.rhoMax, 1e-8)
      close(other.shearCentre.y, centre.y, 1e3 + one.rhoMax, 1e-8)
    }), runs)
  })

  it('does not change with the order of the table or the sense of its walls', () => {
    fc.assert(fc.property(sections, (section) => {
      const turned: OpenSection = { ...section, nodes: [...section.nodes].reverse(), walls: [...section.walls].reverse().map(reversed) }
      const [one, other] = [properties(section), properties(turned)]
      close(torsion(turned).GJ, torsion(section).GJ)
      closeGamma(turned, section)
      close(other.omegaMax, one.omegaMax, one.rhoMax ** 2, 1e-8)
      close(other.shearCentre.x, one.shearCentre.x, 1 + one.rhoMax)
    }), runs)
  })

  it('does not change when a wall is split in two', () => {
    fc.assert(fc.property(sections, fc.double({ min: 0.1, max: 0.9, noNaN: true }), (section, part) => {
      const [wall, ...rest] = section.walls as [OpenWall, ...OpenWall[]]
      fc.pre(!wall.arc)
      const [a, b] = [wall.from, wall.to].map(id => section.nodes.find(node => node.id === id)) as [SectionNode, SectionNode]
      const middle = { id: 'split', x: a.x + part * (b.x - a.x), y: a.y + part * (b.y - a.y) }
      fc.pre(Math.min(part, 1 - part) * Math.hypot(b.x - a.x, b.y - a.y) > 2 * Math.max(wall.t, wall.tEnd ?? 0))
      const between = wall.t + part * ((wall.tEnd ?? wall.t) - wall.t)
      const split: OpenSection = { ...section, nodes: [...section.nodes, middle], walls: [{ ...wall, to: 'split', ...(wall.tEnd === undefined ? {} : { tEnd: between }) }, { ...wall, id: 'other half', from: 'split', t: between }, ...rest] }
      const [one, other] = [properties(section), properties(split)]
      close(torsion(split).GJ, torsion(section).GJ)
      expect(torsion(split).corners.map(({ node }) => node)).toEqual(torsion(section).corners.map(({ node }) => node))
      closeGamma(split, section)
      close(other.In, one.In, undefined, 1e-8)
    }), runs)
  })

  it('mirrors: properties stay, Ixy and the shear centre change sides', () => {
    fc.assert(fc.property(sections, (section) => {
      const mirrored: OpenSection = {
        ...section, nodes: section.nodes.map(({ id, x, y }) => ({ id, x: -x, y })),
        walls: section.walls.map(wall => (wall.arc ? { ...wall, arc: { ...wall.arc, sweep: -wall.arc.sweep } } : wall)),
      }
      const [one, other] = [properties(section), properties(mirrored)]
      close(torsion(mirrored).GJ, torsion(section).GJ)
      closeGamma(mirrored, section)
      close(other.shearCentre.x, -one.shearCentre.x, 1 + one.rhoMax)
      close(other.Ixy, -one.Ixy, one.Ixx + one.Iyy)
    }), runs)
  })

  it('superposes torques, gives back the torque of a rate, and its shares sum to one', () => {
    const torques = fc.double({ min: -1e6, max: 1e6, noNaN: true })
    fc.assert(fc.property(sections, torques, torques, (section, first, second) => {
      const whole = torsion(section)
      const [a, b, both] = [first, second, first + second].map(torque => given(respondToTorque(whole, torque)))
      close((a?.rate ?? 0) + (b?.rate ?? 0), both?.rate ?? 0, Math.abs(a?.rate ?? 0) + Math.abs(b?.rate ?? 0))
      close(given(respondToRate(whole, a?.rate ?? 0)).torque, first)
      close(whole.perWall.reduce((total, { share }) => total + share, 0), 1, 1, 1e-12)
      close((both?.perWall ?? []).reduce((total, { torque }) => total + torque, 0), first + second, Math.abs(first) + Math.abs(second), 1e-12)
      close(whole.plainGJ + whole.lengthTerm + whole.endTerm + whole.bulgeTerm, whole.GJ)
    }), runs)
  })

  it('keeps ω orthogonal, and ω about the shear centre the same from every start of the walk', () => {
    fc.assert(fc.property(sections, (section) => {
      const { residuals, omegaAt, omegaMax, rhoMax } = properties(section)
      for (const residual of Object.values(residuals)) expect(residual).toBeLessThan(1e-9)
      const turned = properties({ ...section, walls: [...section.walls].reverse() })
      for (const [node, omega] of Object.entries(omegaAt)) close(turned.omegaAt[node] ?? Number.NaN, omega, Math.max(omegaMax, 1e-3 * rhoMax ** 2), 1e-8)
    }), runs)
  })

  it('shows a finite value or a reason for any numbers at all', () => {
    const anything = fc.double()
    const node = fc.record({ id: fc.constantFrom('a', 'b', 'c', 'd'), x: anything, y: anything })
    const arc = fc.record({ radius: anything, sweep: anything })
    const wall = fc.record({ id: fc.constantFrom('1', '2', '3'), from: fc.constantFrom('a', 'b', 'c'), to: fc.constantFrom('b', 'c', 'd'), t: anything, tEnd: fc.option(anything, { nil: undefined }), G: anything, arc: fc.option(arc, { nil: undefined }) })
    const junction: fc.Arbitrary<Junction> = fc.record({ node: fc.constantFrom('b', 'c'), radius: anything, make: fc.constantFrom('machined' as const, 'bent' as const) })
    fc.assert(fc.property(fc.array(node, { maxLength: 4 }), fc.array(wall, { maxLength: 3 }), fc.array(junction, { maxLength: 2 }), (nodes, walls, junctions) => {
      const section = { nodes, walls: walls.map(({ arc: curve, tEnd, ...one }) => ({ ...one, ...(curve ? { arc: curve } : {}), ...(tEnd === undefined ? {} : { tEnd }) })), junctions }
      for (const result of [torsionOfOpenSection(section), sectorialProperties(section)]) {
        if (!result.ok) expect(result.reason).not.toBe('')
        else for (const value of Object.values(result)) if (typeof value === 'number') expect(Number.isFinite(value)).toBe(true)
      }
    }), { numRuns: 400 })
  })
})
