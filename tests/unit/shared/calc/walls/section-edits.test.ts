/** The pure geometry of the drawing: what an edit changes, what it leaves alone, and what the wall table then says. */
import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { mirrorSection } from '#shared/calc/walls/mirror'
import { placedSection, readTyped, type PlacedSection } from '#shared/calc/walls/placed'
import { addWall, curveWall, moveNode, removeWall, splitWall, type Edited } from '#shared/calc/walls/section-edits'
import { writtenTable } from '#shared/calc/walls/written'
import type { WallTable } from '#shared/calc/parts/wall-fields'
import type { OpenSection } from '#shared/torsion/section'
import { torsionOfOpenSection } from '#shared/torsion/open-section'
import { given } from '../../../../reference/engine'
import { hatInputs, lippedChannelInputs, polyline, quantity } from '../../../../factories/open-section'

const read = readTyped()
const how = { unit: 'mm' as const, read }
const like = { t: quantity('2', 'mm'), material: 'M' }
const origin = { start: { x: quantity('0', 'mm'), y: quantity('0', 'mm') } }
const placed = (table: WallTable) => placedSection(table, read)
const tableOf = (section: PlacedSection) => writtenTable(section, origin, how)
const strip = (): PlacedSection => placed({ ...polyline([['0', '0'], ['40', '0']], ['strip'], '2', 'M'), junctions: [] })

function done(edited: Edited) {
  if (!edited.ok) throw new Error(edited.reason)
  return edited.section
}
const reason = (edited: Edited) => (edited.ok ? 'was done' : edited.reason)

function engineSection({ nodes, walls }: PlacedSection): OpenSection {
  return {
    nodes: [...nodes].map(([id, p]) => ({ id, ...p })), junctions: [],
    walls: walls.map(({ id, from, to, arc, input }) => ({ id, from, to, t: Number(input.t.text), G: 27_000, ...(arc ? { arc: { radius: arc.radius, sweep: arc.sweep, startDirection: arc.direction } } : {}) })),
  }
}
const J = (section: PlacedSection) => given(torsionOfOpenSection(engineSection(section))).J ?? Number.NaN

/** Trees of walls on a 5 mm grid that grow to the right, so that no wall crosses another. */
const sections = fc.array(fc.record({ rise: fc.integer({ min: -4, max: 4 }), run: fc.integer({ min: 1, max: 6 }) }), { minLength: 1, maxLength: 8 }).map((steps) => {
  let section = strip()
  let at = { x: 40, y: 0 }
  let node = '2'
  for (const { rise, run } of steps) {
    at = { x: at.x + 5 * run, y: at.y + 5 * rise }
    const edited = addWall(section, [{ node }, { at }], like)
    if (!edited.ok) throw new Error(edited.reason)
    section = edited.section
    node = edited.node ?? node
  }
  return section
})
const runs = { numRuns: 300, seed: 20_261_201 }
const near = (a: PlacedSection, b: PlacedSection, within = 1e-7) => {
  expect([...b.nodes.keys()].toSorted()).toEqual([...a.nodes.keys()].toSorted())
  for (const [id, p] of a.nodes) {
    expect(Math.abs((b.nodes.get(id)?.x ?? NaN) - p.x), `node ${id}`).toBeLessThan(within)
    expect(Math.abs((b.nodes.get(id)?.y ?? NaN) - p.y), `node ${id}`).toBeLessThan(within)
  }
}

describe('laws of the drawing', () => {
  it('what is written leads to the same places again', () => {
    fc.assert(fc.property(sections, section => near(section, placed(tableOf(section)))), runs)
  })
  it('places on the grid are written as they are, without a stray digit', () => {
    fc.assert(fc.property(sections, (section) => {
      for (const { end } of tableOf(section).walls) {
        const texts = end.by === 'point' ? [end.x.text, end.y.text] : end.by === 'length' ? [end.length.text, end.direction.text] : []
        for (const text of texts) expect(text).toMatch(/^-?\d+$/)
      }
    }), runs)
  })
  it('moving a node leaves every other node and wall where it was', () => {
    fc.assert(fc.property(sections, fc.nat(), fc.integer({ min: -3, max: 3 }), (section, pick, by) => {
      const id = [...section.nodes.keys()][pick % section.nodes.size] ?? '1'
      const to = { x: (section.nodes.get(id)?.x ?? 0) + 0.5, y: (section.nodes.get(id)?.y ?? 0) + by }
      const after = placed(tableOf(done(moveNode(section, id, to))))
      near({ ...section, nodes: new Map([...section.nodes, [id, to]]) }, after)
      for (const wall of section.walls.filter(one => one.from !== id && one.to !== id)) expect(after.walls.find(one => one.id === wall.id)).toMatchObject({ from: wall.from, to: wall.to, arc: wall.arc })
    }), runs)
  })
  it('splitting a wall changes nothing about J', () => {
    fc.assert(fc.property(sections, fc.nat(), fc.double({ min: 0.2, max: 0.8, noNaN: true }), (section, pick, part) => {
      const wall = section.walls[pick % section.walls.length]
      const after = placed(tableOf(done(splitWall(section, wall?.id ?? '', part))))
      expect(J(after) / J(section)).toBeCloseTo(1, 8)
    }), runs)
  })
  it('mirrored twice is mirrored once', () => {
    fc.assert(fc.property(sections, (section) => {
      const axis = { along: 'y', at: 0 } as const
      const once = done(mirrorSection(section, axis))
      expect(once.walls).toHaveLength(2 * section.walls.length)
      expect(J(once) / (2 * J(section))).toBeGreaterThan(0.99)
      const twice = done(mirrorSection(once, axis))
      near(once, twice)
      expect(twice.walls.map(wall => wall.id)).toEqual(once.walls.map(wall => wall.id))
      near(once, placed(tableOf(once)))
    }), runs)
  })
  it('removing the wall that was drawn last gives the section before it', () => {
    fc.assert(fc.property(sections, (section) => {
      const more = addWall(section, [{ node: '1' }, { at: { x: 0, y: -35 } }], like)
      near(section, done(removeWall(done(more), more.ok ? more.wall ?? '' : '')))
    }), runs)
  })
})

describe('drawing', () => {
  it('builds the walls that a person would type', () => {
    let section = done(addWall(strip(), [{ node: '2' }, { at: { x: 40, y: 25 } }], like))
    section = done(addWall(section, [{ node: '3' }, { at: { x: 20, y: 35 } }], like))
    expect(tableOf(section).walls.map(({ id, from, to, end }) => [id, from, to, end])).toEqual([
      ['a', '1', '2', { by: 'point', x: quantity('40', 'mm'), y: quantity('0', 'mm') }],
      ['b', '2', '3', { by: 'length', length: quantity('25', 'mm'), direction: quantity('90', '°') }],
      ['c', '3', '4', { by: 'point', x: quantity('20', 'mm'), y: quantity('35', 'mm') }],
    ])
  })
  it('keeps what was typed of walls that were not touched, in their units', () => {
    const table: WallTable = { ...polyline([['0', '0'], ['1 1/2', '0'], ['1.5', '2.0']], [], '0.063', 'M', 'in'), junctions: [] }
    const after = writtenTable(done(moveNode(placed(table), '3', { x: 50.8, y: 50.8 })), table, { unit: 'in', read })
    expect(after.walls[0]).toEqual(table.walls[0])
    expect(after.walls[1]?.end).toEqual({ by: 'point', x: quantity('2', 'in'), y: quantity('2', 'in') })
    expect(after.start).toBe(table.start)
  })
  it('moves the first node without moving the walls beyond it', () => {
    const table = hatInputs()
    const after = writtenTable(done(moveNode(placed(table), '1', { x: -40, y: 0 })), table, how)
    expect(after.start.x.text).toBe('-40')
    expect(after.walls.slice(1)).toEqual(table.walls.slice(1))
  })
  it('joins a new wall from a free place to a node, and refuses one that is joined to nothing', () => {
    const joined = done(addWall(strip(), [{ at: { x: 0, y: 30 } }, { node: '1' }], like))
    near(joined, placed(tableOf(joined)))
    expect(reason(addWall(strip(), [{ at: { x: 0, y: 30 } }, { at: { x: 9, y: 30 } }], like))).toContain('at a node of the section')
    expect(reason(addWall(strip(), [{ node: '1' }, { at: { x: 0, y: 0 } }], like))).toContain('no length')
    expect(reason(addWall(strip(), [{ node: '2' }, { node: '1' }], like))).toContain('already')
  })
  it('curves a wall between its ends and straightens it again', () => {
    const arc = placed(tableOf(done(curveWall(strip(), 'a', Math.PI))))
    // A half circle over a chord of 40 has a radius of 20.
    expect(arc.walls[0]?.arc?.radius).toBeCloseTo(20, 9)
    near(strip(), arc)
    near(strip(), placed(tableOf(done(curveWall(arc, 'a', 0)))))
    expect(reason(curveWall(strip(), 'a', 2 * Math.PI))).toContain('less than a full circle')
  })
  it('splits a tapering wall at the thickness it has there', () => {
    const table = { ...polyline([['0', '0'], ['40', '0']], [], '2', 'M'), junctions: [] }
    const tapering = { ...table, walls: table.walls.map(wall => ({ ...wall, tEnd: quantity('4', 'mm') })) }
    const after = tableOf(done(splitWall(placed(tapering), 'a')))
    expect(after.walls.map(({ t, tEnd }) => [t.text, tEnd?.text])).toEqual([['2', '3'], ['3', '4']])
  })
  it('mirrors half a lipped channel into the whole, with its corners', () => {
    const whole = lippedChannelInputs()
    const half = done(removeWall(done(removeWall(done(splitWall(placed(whole), 'c')), 'e')), 'd'))
    const halved = done(removeWall(half, 'f'))
    const again = placed(tableOf(done(mirrorSection(halved, { along: 'x', at: 0 }))))
    expect(again.walls).toHaveLength(6)
    expect(again.junctions).toHaveLength(4)
    expect(J(again) / J(placed(whole))).toBeCloseTo(1, 9)
  })
  it('refuses to mirror into two pieces, and to take out what holds the section together', () => {
    expect(reason(mirrorSection(strip(), { along: 'x', at: 50 }))).toContain('No node lies on the axis')
    expect(reason(removeWall(placed(hatInputs()), 'c'))).toContain('holds the section together')
    expect(reason(removeWall(strip(), 'a'))).toContain('one wall at least')
  })
  it('keeps aside walls that cannot be placed, as they are', () => {
    const table = { ...polyline([['0', '0'], ['40', '0'], ['oops', '30']], [], '2', 'M'), junctions: [] }
    const section = placed(table)
    expect(section.loose.map(wall => wall.id)).toEqual(['b'])
    const after = tableOf(done(addWall(section, [{ node: '1' }, { at: { x: 0, y: 10 } }], like)))
    expect(after.walls.map(wall => wall.id)).toEqual(['a', 'c', 'b'])
    expect(after.walls[2]).toEqual(table.walls[1])
  })
  it('turns a wall round where only its last node is reached any more', () => {
    const table = { ...polyline([['0', '0'], ['40', '0'], ['40', '33']], [], '2', 'M'), junctions: [] }
    const branched = done(addWall(placed(table), [{ node: '3' }, { at: { x: 7, y: 50 } }], like))
    const without = done(removeWall({ ...branched, walls: branched.walls.toReversed() }, 'a'))
    near(without, placed(tableOf(without)))
  })
})
