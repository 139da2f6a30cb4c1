/** Tables and plots along the bar, and what Saint-Venant’s torsion alone would give. */
import type { ComparedValue, Plot, ResultTable } from '#shared/calc/types'
import { bimomentUnit, torqueUnit } from '#shared/calc/kinds/restrained-warping/outputs'
import type { WarpingCase, WarpingSolution } from '#shared/calc/kinds/restrained-warping/solution'
import { shownUnits } from '#shared/calc/parts/shown-units'
import { settled } from '#shared/calc/kinds/restrained-warping/settled'
import { fibreStress } from '#shared/torsion/warping/sectorial-run'
import { placeOf, type Place } from '#shared/torsion/warping/bar-run'
import { warpingBar } from '#shared/torsion/warping/warping-bar'

/** More lines than these are shown as their envelope. */
const MOST_LINES = 6
/** Plots of long bars are thinned to about this many points. */
const MOST_POINTS = 400

export const decisiveCase = (s: WarpingSolution): WarpingCase | undefined => s.cases.find(c => c.model.id === s.governing?.caseId) ?? s.cases[0]

export function restrainedWarpingTables(s: WarpingSolution): ResultTable[] {
  const decisive = decisiveCase(s)
  return decisive ? [stationTable(s, decisive), fibreTable(s, decisive), supportTable(s, decisive)] : []
}

/** Both sides of every node, and the middle of every member. */
function stationTable(s: WarpingSolution, c: WarpingCase): ResultTable {
  const u = shownUnits(s.model)
  const { member } = c.run.plan
  const rows = s.cut.members.flatMap((_, e) => {
    const first = member.indexOf(e)
    const last = member.lastIndexOf(e)
    return [first, (first + last) >> 1, last].map(i => placeOf(c.run, i))
  })
  const torque = (key: string, label: string) => ({ key, label, dimension: 'torque' as const, unit: torqueUnit(s) })
  return {
    key: 'stations', title: `Along the bar, case ${c.model.id}`,
    columns: [
      { key: 'z', label: 'Station', dimension: 'length', unit: u.length }, { key: 'phi', label: 'Twist', dimension: 'angle', unit: '°' },
      { key: 'rate', label: 'Rate of twist', dimension: 'rateOfTwist', unit: u.rate }, { key: 'B', label: 'Bimoment', dimension: 'bimoment', unit: bimomentUnit(s) },
      torque('T', 'Torque'), torque('Tsv', 'By twist'), torque('Tw', 'By warping'),
    ],
    rows: rows.map((at, i) => ({ id: String(i), cells: [at.z, at.phi, settled(at.rate, c.peaks.rate.rate), settled(at.B, c.peaks.B.B), settled(at.T, c.peaks.T.T), settled(at.Tsv, c.peaks.T.T), settled(at.Tw, c.peaks.T.T)] })),
  }
}

/** Every fibre at the station of the largest equivalent stress. */
function fibreTable(s: WarpingSolution, c: WarpingCase): ResultTable {
  const u = shownUnits(s.model)
  const place = c.stress.reduce<{ value: number, place: Place } | null>((high, one) => (one.mises.value > (high?.value ?? -1) ? one.mises : high), null)?.place
  const stress = (key: string, label: string) => ({ key, label, dimension: 'stress' as const, unit: u.stress })
  const most = s.run.fibres.reduce((high, fibre) => Math.max(high, Math.abs(fibre.S)), 0)
  const highest = c.stress.reduce((high, one) => Math.max(high, one.mises.value), 0)
  return {
    key: 'fibres', title: `Fibres at station ${(place?.z ?? 0).toFixed(1)} mm, case ${c.model.id}`,
    columns: [
      { key: 'wall', label: 'Wall', dimension: null, unit: '' }, { key: 'x', label: 'x', dimension: 'length', unit: u.length }, { key: 'y', label: 'y', dimension: 'length', unit: u.length },
      { key: 'omega', label: 'Sectorial coordinate', dimension: 'sectorial', unit: u.area }, { key: 'S', label: 'Statical moment', dimension: 'inertia', unit: u.inertia },
      stress('sigma', 'Normal stress'), stress('left', 'Shear, left face'), stress('right', 'Shear, right face'),
    ],
    rows: place ? s.run.fibres.map((fibre, i) => {
      const { sigma, left, right } = fibreStress(fibre, s.run.properties.gamma, { B: place.B, Tw: place.Tw, rate: place.rate, axial: c.axialStress })
      return { id: String(i), cells: [fibre.wall, fibre.at.x, fibre.at.y, settled(fibre.omega, s.run.properties.omegaMax), settled(fibre.S, most), settled(sigma, highest), settled(left, highest), settled(right, highest)] }
    }) : [],
  }
}

function supportTable(s: WarpingSolution, c: WarpingCase): ResultTable {
  return {
    key: 'supports', title: `Supports, case ${c.model.id}`,
    columns: [
      { key: 'support', label: 'Support', dimension: null, unit: '' }, { key: 'z', label: 'Station', dimension: 'length', unit: shownUnits(s.model).length },
      { key: 'T', label: 'Torque', dimension: 'torque', unit: torqueUnit(s) }, { key: 'B', label: 'Bimoment', dimension: 'bimoment', unit: bimomentUnit(s) },
    ],
    rows: s.model.supports.map(({ z, twist, warping }, i) => {
      const found = c.response.reactions.find(one => one.node === s.cut.nodeAt(z))
      return { id: String(i + 1), cells: [String(i + 1), z, twist === 'free' ? null : found?.torque ?? null, warping === 'free' ? null : found?.bimoment ?? null] }
    }),
  }
}

export function restrainedWarpingPlots(s: WarpingSolution): Plot[] {
  const decisive = decisiveCase(s)
  if (!decisive) return []
  const u = shownUnits(s.model)
  const x = { label: 'Station', symbol: 'z', dimension: 'length', unit: u.length } as const
  const shares = ([['torque', 'T'], ['by twist', 'Tsv'], ['by warping', 'Tw']] as const).map(([name, key]) => ({ name, caseId: decisive.model.id, points: pointsOf(decisive, key) }))
  return [
    { key: 'twist', title: 'Twist along the bar', x, y: { label: 'Twist', symbol: '\\varphi', dimension: 'angle', unit: '°' }, series: series(s, 'phi') },
    { key: 'bimoment', title: 'Bimoment along the bar', x, y: { label: 'Bimoment', symbol: 'B', dimension: 'bimoment', unit: bimomentUnit(s) }, series: series(s, 'B') },
    { key: 'torque', title: `Torque along the bar, case ${decisive.model.id}`, x, y: { label: 'Torque', symbol: 'T', dimension: 'torque', unit: torqueUnit(s) }, series: shares },
  ]
}

type Line = 'phi' | 'B' | 'T' | 'Tw' | 'Tsv'

function series(s: WarpingSolution, line: Line): Plot['series'] {
  if (s.cases.length <= MOST_LINES) return s.cases.map(c => ({ name: c.model.id, caseId: c.model.id, points: pointsOf(c, line) }))
  const [first] = s.cases
  if (!first) return []
  const outer = (pick: (a: number, b: number) => number): [number, number][] => shownStations(first).map(i => [stationZ(first, i), s.cases.reduce((held, c) => pick(held, valueAt(c, line, i)), valueAt(first, line, i))])
  return [{ name: 'largest of all cases', points: outer(Math.max) }, { name: 'smallest of all cases', points: outer(Math.min) }]
}

const valueAt = ({ run }: WarpingCase, line: Line, i: number): number => (line === 'Tsv' ? (run.T[i] ?? 0) - (run.Tw[i] ?? 0) : run[line][i] ?? 0)
const stationZ = ({ run: { plan } }: WarpingCase, i: number): number => (plan.start[plan.member[i] ?? 0] ?? 0) + (plan.z[i] ?? 0)

/** Ends of members always stand; between them stations are left out where there are too many. */
function shownStations({ run: { plan: { member } } }: WarpingCase): number[] {
  const step = Math.ceil(member.length / MOST_POINTS)
  return Array.from(member, (_, i) => i).filter(i => i % step === 0 || member[i - 1] !== member[i] || member[i + 1] !== member[i])
}

const pointsOf = (c: WarpingCase, line: Line): [number, number][] => shownStations(c).map(i => [stationZ(c, i), valueAt(c, line, i)])

export function comparedTwist(s: WarpingSolution): ComparedValue[] {
  const c = decisiveCase(s)
  const plain = c ? plainTwist(s, c) : null
  if (!c || plain === null) return []
  return [{
    key: 'plain_twist', label: `Largest twist by Saint-Venant’s torsion alone, case ${c.model.id}`, used: Math.abs(c.peaks.phi.phi), compared: plain, dimension: 'angle', unit: '°',
    source: 'T/GJ along the bar with all warping free: under a single torque not below the twist of the restrained bar, but silent on its normal stress (§3.6)',
  }]
}

/** Null where a bimoment acts, which Saint-Venant’s torsion knows nothing of. */
function plainTwist({ cut, model: { supports } }: WarpingSolution, { load }: WarpingCase): number | null {
  if (load.bimoments.length > 0) return null
  const bar = warpingBar(cut.members.map(one => ({ ...one, EG: 0 })), supports.map(({ z, twist }) => ({ node: cut.nodeAt(z), twist, warping: 'free' })))
  if (!bar.ok) return null
  const response = bar.respond(load)
  return 'ok' in response ? null : Math.abs(bar.peaks(response).phi.phi)
}
