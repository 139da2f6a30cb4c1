/** A 1 % fault in any constant or formula of the solids is seen by their reference rows. */
import { coefficient, describeFaults, fault, result, scaled, type Exports, type Mutation } from '../../../factories/engine-faults'
import { solidRows } from '../../../reference/solid-rows'

const at = (name: string): string => `torsion/solids/${name}`

/** One number of one line of a table 1 % high. */
const cell = (table: string, line: number, column: number) => (all: Exports): Exports => {
  const lines = all[table] as number[][]
  return { ...all, [table]: lines.map((one, i) => (i === line ? one.map((value, k) => (k === column ? value * fault : value)) : one)) }
}
const polygon = (shape: string, key: 'J' | 'peak') => (all: Exports): Exports => {
  const polygons = all.polygons as Record<string, Record<string, number>>
  return { ...all, polygons: { ...polygons, [shape]: { ...polygons[shape], [key]: (polygons[shape]?.[key] ?? 0) * fault } } }
}

const constants: Mutation[] = [
  ...['isoscelesJ', 'isoscelesPeak', 'isoscelesHandbook', 'isoscelesPlastic'].map((key): Mutation => ({ name: key, module: at('published'), spoil: scaled(key) })),
  ...(['pentagon', 'hexagon', 'octagon'] as const).flatMap(shape => (['J', 'peak'] as const).map((key): Mutation => ({ name: `${key} of the ${shape}`, module: at('published'), spoil: polygon(shape, key) }))),
  ...[0, 1, 2, 3, 4, 5, 6, 7].flatMap(line => ([1, 2] as const).map((column): Mutation => ({ name: `segment table, line ${line}, column ${column}`, module: at('published'), spoil: cell('segmentTable', line, column) }))),
  ...['c1', 'c2'].map((key): Mutation => ({ name: `handbook rectangle ${key}`, module: at('published'), spoil: coefficient('rectangleHandbookJ', key) })),
  ...[0, 1, 2, 3].map((i): Mutation => ({ name: `handbook rectangle, power ${i + 1}`, module: at('published'), spoil: coefficient('rectangleHandbookPeak', i) })),
]
const formulas: Mutation[] = [
  { name: 'β', module: at('rectangle'), spoil: result('torsionOfRectangle', 'J') },
  { name: 'area', module: at('solid'), spoil: result('solidTorsion', 'A') },
  { name: 'J', module: at('solid'), spoil: result('solidTorsion', 'J') },
  { name: 'torsional modulus', module: at('solid'), spoil: result('solidTorsion', 'WT') },
  { name: 'plastic torque', module: at('solid'), spoil: result('solidTorsion', 'plastic') },
  { name: 'circle', module: at('rounds'), spoil: result('torsionOfCircle', 'J', 'WT', 'A') },
  { name: 'ellipse', module: at('rounds'), spoil: result('torsionOfEllipse', 'J', 'WT', 'A') },
  { name: 'triangle', module: at('triangles'), spoil: result('torsionOfEquilateral', 'J', 'WT') },
  { name: 'sector', module: at('sector'), spoil: result('torsionOfSector', 'J', 'WT') },
  { name: 'semicircle', module: at('sector'), spoil: result('torsionOfSemicircle', 'J', 'WT') },
  { name: 'segment', module: at('segment'), spoil: result('torsionOfSegment', 'J', 'WT') },
]

describeFaults('a 1 % fault in the solids', [...constants, ...formulas], solidRows)
