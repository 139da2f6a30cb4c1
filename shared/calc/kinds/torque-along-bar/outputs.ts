import type { Output, Plot, ResultTable } from '#shared/calc/types'
import type { AlongCase, AlongSolution } from '#shared/calc/kinds/torque-along-bar/solve'
import { factorOutputs, marginOutputs, materialOutputs, output } from '#shared/calc/parts/output'
import { shownUnits } from '#shared/calc/parts/shown-units'
import { sub } from '#shared/calc/parts/tex'

/** More lines than these are shown as their envelope. */
const MOST_LINES = 6
const torqueUnit = ({ model }: AlongSolution) => (model.units === 'SI' ? 'N·m' as const : 'lbf·in' as const)

export function alongOutputs(s: AlongSolution): Output[] {
  const { model } = s
  const u = shownUnits(model)
  return [
    ...output('length', 'L', 'Length of the bar', s.bar.length, 'length', u.length, '§5.1'),
    ...output('twist_allowed', '\\varphi_{a}', 'Twist allowed', model.twistAllowed?.value, 'angle', model.twistAllowed?.unit ?? '°', '§7.8'),
    ...factorOutputs(model.factors), ...materialOutputs(model.materials), ...s.cases.flatMap(c => caseOutputs(s, c)), ...marginOutputs(s.margins, s.governing),
  ]
}

function caseOutputs(s: AlongSolution, c: AlongCase): Output[] {
  const { model } = s
  const u = shownUnits(model)
  const [id, torque] = [c.model.id, torqueUnit(s)]
  const extra = { caseId: id }
  const few = s.cases.length === 1
  return [
    ...model.segments.flatMap((segment, i) => [
      ...output(`T:${segment.id}@${id}`, `T_{${sub(segment.id)}}`, `Torque in segment ${segment.id}, case ${id}`, c.segments[i]?.torque, 'torque', torque, '§5.1', { ...extra, primary: few }),
      ...output(`tau:${segment.id}@${id}`, `\\tau_{${sub(segment.id)}}`, `Largest shear stress in segment ${segment.id}, case ${id}`, c.segments[i]?.tau, 'stress', u.stress, '§5.1', extra),
    ]),
    ...c.response.nodes.flatMap((node, i) => output(`phi:${i}@${id}`, `\\varphi_{${i}}`, `Twist at node ${i}, case ${id}`, node.phi, 'angle', '°', '§5.1', extra)),
    ...c.response.reactions.flatMap(one => output(`R:${one.node}@${id}`, `R_{${one.node}}`, `Reaction at node ${one.node}, case ${id}`, one.torque, 'torque', torque, '§5.2', extra)),
    ...output(`twist_max@${id}`, '\\varphi_{max}', `Largest twist, case ${id}`, c.twistMax, 'angle', '°', '§5.1', { ...extra, primary: few }),
  ]
}

export function alongTables(s: AlongSolution): ResultTable[] {
  const torque = torqueUnit(s)
  const u = shownUnits(s.model)
  const decisive = s.cases.find(c => c.model.id === s.governing?.caseId) ?? s.cases[0]
  if (!decisive) return []
  return [{
    key: 'segments', title: `Segments, case ${decisive.model.id}`,
    columns: [{ key: 'segment', label: 'Segment', dimension: null, unit: '' }, { key: 'T', label: 'Torque', dimension: 'torque', unit: torque }, { key: 'tau', label: 'Shear stress', dimension: 'stress', unit: u.stress }],
    rows: s.model.segments.map((segment, i) => ({ id: segment.id, cells: [segment.title === '' ? segment.id : `${segment.id} ${segment.title}`, decisive.segments[i]?.torque ?? null, decisive.segments[i]?.tau ?? null] })),
  }, {
    key: 'nodes', title: `Nodes, case ${decisive.model.id}`,
    columns: [{ key: 'node', label: 'Node', dimension: null, unit: '' }, { key: 'z', label: 'Station', dimension: 'length', unit: u.length }, { key: 'phi', label: 'Twist', dimension: 'angle', unit: '°' }, { key: 'R', label: 'Reaction', dimension: 'torque', unit: torque }],
    rows: decisive.response.nodes.map((node, i) => ({ id: String(i), cells: [String(i), node.z, node.phi, decisive.response.reactions.find(one => one.node === i)?.torque ?? null] })),
  }]
}

export function alongPlots(s: AlongSolution): Plot[] {
  const u = shownUnits(s.model)
  const x = { label: 'Station', symbol: 'z', dimension: 'length', unit: u.length } as const
  const series = (value: (at: AlongCase['stations'][number]) => number): Plot['series'] => {
    if (s.cases.length <= MOST_LINES) return s.cases.map(c => ({ name: c.model.id, caseId: c.model.id, points: c.stations.map((at): [number, number] => [at.z, value(at)]) }))
    const first = s.cases[0]?.stations ?? []
    const outer = (pick: (a: number, b: number) => number): [number, number][] => first.map((at, i) => [at.z, s.cases.reduce((held, c) => pick(held, value(c.stations[i] ?? at)), value(at))])
    return [{ name: 'largest of all cases', points: outer(Math.max) }, { name: 'smallest of all cases', points: outer(Math.min) }]
  }
  return [
    { key: 'torque', title: 'Torque along the bar', x, y: { label: 'Torque', symbol: 'T', dimension: 'torque', unit: torqueUnit(s) }, series: series(at => at.T) },
    { key: 'twist', title: 'Twist along the bar', x, y: { label: 'Twist', symbol: '\\varphi', dimension: 'angle', unit: '°' }, series: series(at => at.phi) },
  ]
}
