/** Sections at the ends of what can be drawn: very many walls, gaps near nothing, sizes far apart. */
import { describe, expect, it } from 'vitest'
import type { OpenSection } from '#shared/torsion/section'
import { torsionOfOpenSection } from '#shared/torsion/open-section'
import { checkSection } from '#shared/torsion/section-check'
import { sectorialProperties } from '#shared/torsion/sectorial'
import { given } from '../../../reference/engine'
import { chain } from '../../../reference/sections'

/** A meander of walls of 30 and 10 mm. */
const meander = (walls: number): OpenSection => chain(Array.from({ length: walls + 1 }, (_, i) => [10 * Math.ceil(i / 2), i % 4 < 2 ? 0 : 30] as const), 1.6, [], { E: 71_000 })

describe('a thousand walls', () => {
  it('have the sum of L·t³/3, and finite sectorial properties', () => {
    const section = meander(1000)
    const { plainGJ, perWall } = given(torsionOfOpenSection(section))
    // 500 walls of 30 and 500 of 10 mm, t 1.6.
    expect(plainGJ / 26_900 / (20_000 * 1.6 ** 3 / 3)).toBeCloseTo(1, 12)
    expect(perWall).toHaveLength(1000)
    const { gamma, residuals } = given(sectorialProperties(section))
    expect(Number.isFinite(gamma) && gamma > 0).toBe(true)
    expect(Math.max(...Object.values(residuals))).toBeLessThan(1e-9)
  })

  it('that cross are told by name', () => {
    const section = meander(1000)
    const [first, last] = [section.nodes[0], section.nodes.at(-1)]
    const crossing: OpenSection = { ...section, nodes: [...section.nodes, { id: 'far', x: -5, y: 15 }], walls: [...section.walls, { id: 'across', from: last?.id ?? '', to: 'far', t: 1.6, G: 26_900, E: 71_000 }] }
    expect(first).toBeDefined()
    const checked = checkSection(crossing)
    expect(checked.ok ? '' : checked.reason).toContain('across')
  })
})

describe('a gap near nothing', () => {
  const box = (gap: number): OpenSection => chain([[0, 0], [50, 0], [50, 30], [0, 30], [0, gap]], 2)

  it.each([1e-9, 1e-7, 5e-5])('of %s mm is a seam that is told, and the section is open', (gap) => {
    const checked = checkSection(box(gap))
    expect(checked.ok ? checked.seams.length : checked.reason).toBe(1)
    expect(given(torsionOfOpenSection(box(gap))).plainGJ / 26_900).toBeCloseTo(160 * 8 / 3, 3)
  })

  it('of 1 mm is a slit and no seam', () => {
    const checked = checkSection(box(1))
    expect(checked.ok ? checked.seams : checked.reason).toEqual([])
  })

  it('between a node and a wall it should end on is told as a crossing, not computed as a part of its own', () => {
    const tee: OpenSection = {
      nodes: [{ id: '1', x: 0, y: 0 }, { id: '2', x: 50, y: 0 }, { id: '3', x: 25, y: 1e-9 }, { id: '4', x: 25, y: 40 }],
      walls: [{ id: 'a', from: '1', to: '2', t: 2, G: 26_900 }, { id: 'b', from: '3', to: '4', t: 2, G: 26_900 }], junctions: [],
    }
    const checked = checkSection(tee)
    expect(checked.ok ? '' : checked.reason).not.toBe('')
  })
})

describe('sizes far apart', () => {
  it.each([[1e-6, 1e-7], [1e6, 1e4]])('a channel of %s mm with walls of %s mm keeps every digit of its shape', (size, t) => {
    const one = given(torsionOfOpenSection(chain([[size, 0], [0, 0], [0, 2 * size], [size, 2 * size]], t)))
    expect(one.plainGJ / 26_900 / (4 * size * t ** 3 / 3)).toBeCloseTo(1, 12)
  })

  it('a wall of 1e-9 of the size is no wall, and says so', () => {
    const checked = checkSection(chain([[0, 0], [1e6, 0], [1e6, 1e-4]], 2))
    expect(checked.ok ? '' : checked.reason).toContain('no length')
  })
})
