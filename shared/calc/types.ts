/**
 * What every calculation kind gives back. Neutral data: the page, the PDF and
 * the server read the same object, and nothing in it depends on a locale.
 * Engine values are in N, mm, MPa, rad, K-free °C; `unit` says how to show them.
 */
import type { ZodType } from 'zod'
import type { LinkSource, Links } from '#shared/calc/links'
import type { Dimension, UnitId } from '#shared/units/units'

/** What a person typed: kept as typed, parsed by the server. */
export interface TypedQuantity { text: string, unit: UnitId, from?: LinkSource }

export interface Output {
  /** Stable within the calculation: `J`, `theta@L04`, `tau:a@L04`, `MS:shear-ultimate@L04`. */
  key: string
  /** TeX, e.g. `\\theta'`. */
  symbol: string
  /** Plain words, e.g. `Rate of twist, case L04`. */
  label: string
  /** In engine units. Always finite: an output that cannot be given is absent. */
  value: number
  dimension: Dimension
  /** The unit it is shown in, chosen by the field it follows. */
  unit: UnitId
  caseId?: string
  wall?: string
  /** Section of the methods reference, e.g. `§1.9`. */
  method: string
  /** Results of the first rank are shown on the closed calculation. */
  primary?: boolean
}

export type Severity = 'information' | 'caution' | 'stop'

export interface Guard {
  /** `G-02` */
  id: string
  /** Unique within the calculation, e.g. `G-02:wall-a`. Answers are kept under it. */
  key: string
  severity: Severity
  /** A stop that may be met by a written deviation (†). */
  deviable: boolean
  /** Short name, e.g. `Wall slenderness`. */
  title: string
  /** One sentence with the numbers in it. */
  message: string
  /** What the analyst must write, or what to do. */
  ask: string
  /** The numbers the condition was judged on; an answer lapses when one moves by more than 1 %. */
  values: Record<string, number>
  /** Wall or case it speaks of, where it does. */
  wall?: string
  caseId?: string
  source: string
}

export type LoadLevel = 'limit' | 'ultimate'

export interface MarginRow {
  key: string
  /** Named by the kind, e.g. `shear-ultimate`, `twist`. */
  mode: string
  /** `Shear on the flats, ultimate` */
  modeLabel: string
  level: LoadLevel
  caseId: string
  wall?: string
  place: string
  applied: number
  allowable: number
  dimension: Dimension
  unit: UnitId
  /** Infinity never appears: with no load `loaded` is false and rf/ms are null. */
  loaded: boolean
  rf: number | null
  ms: number | null
  /** Least of its mode, and every row within 0.5 % of it. */
  governingOfMode: boolean
  /** Least of all. */
  governing: boolean
}

export interface WorkingLine {
  /** Formula in symbols, then with numbers and units, then the result: three TeX strings joined by `=` when shown. */
  symbols: string
  numbers: string
  result: string
}
export interface WorkingStep { heading: string, method: string, lines: WorkingLine[] }

/** A drawing in millimetres of section space, y upwards; `app` and `server/pdf` turn it into SVG by the same shared function. */
export type Shape
  = | { type: 'path', points: [number, number][], closed: boolean, role: ShapeRole, level?: number, wall?: string }
    | { type: 'line', from: [number, number], to: [number, number], role: ShapeRole }
    | { type: 'label', at: [number, number], text: string, sub?: string, role: ShapeRole, anchor?: 'start' | 'middle' | 'end' }
    | { type: 'balloon', at: [number, number], text: string, leaderTo: [number, number] }
    | { type: 'dimension', from: [number, number], to: [number, number], offset: number, text: string, /** The text is a symbol, and this its index. */ symbol?: true, sub?: string }
    | { type: 'centroid', at: [number, number] }
    /** `side`: on which side its letter stands, +1 right and up. */
    | { type: 'shear-centre', at: [number, number], side?: [number, number] }
    /** `away` points from the material to where the flag stands; up where absent. */
    /** `flag`: where the leader bends, and where the line under the value ends. */
    | { type: 'peak', at: [number, number], text: string, away?: [number, number], flag?: { knee: [number, number], end: [number, number] } }
    | { type: 'torque', at: [number, number], radius: number, text: string }
export type ShapeRole = 'wall' | 'axis' | 'dimension' | 'flow' | 'note'
export interface Drawing {
  shapes: Shape[]
  box: { x: number, y: number, width: number, height: number }
  /** What a reader who cannot see it must know. */
  alt: string
  /** Ramp legend: value at level 0 and at level 1. */
  ramp?: { max: number, unit: UnitId, label: string }
}

export interface WallRow {
  wall: string
  name: string
  length: number
  thickness: number
  G: number
  /** Torsion constant contribution, mm⁴, after corrections. */
  J: number
  share: number
  slenderness: number
  material: string
  /** By case id: torque carried (N·mm) and peak face stress (MPa). */
  torque: Record<string, number>
  tau: Record<string, number>
  leastMargin: number | null
}

export interface CaseRow {
  caseId: string
  title: string
  level: LoadLevel
  torque: number
  /** rad/mm */
  rate: number
  /** rad over the length, where a length is given */
  twist: number | null
  tauMax: number
  tauMaxWall: string
  /** Including the corner factor; null where no factor is available. */
  tauCorner: number | null
  leastMargin: number | null
}

/** A table of results that is neither walls nor cases: stations, cells, members, parts. */
export interface ResultTable {
  /** Stable within the kind, e.g. `stations`. */
  key: string
  title: string
  /** A column of numbers has a dimension; of words none. */
  columns: { key: string, label: string, symbol?: string, dimension: Dimension | null, unit: UnitId }[]
  /** Cells in the order of the columns, numbers in engine units; null where there is no value. */
  rows: { id: string, cells: (number | string | null)[] }[]
}

export interface PlotAxis { label: string, symbol: string, dimension: Dimension, unit: UnitId }
/** A quantity along the span, or a margin against a variable: values in engine units. */
export interface Plot {
  key: string
  title: string
  x: PlotAxis
  y: PlotAxis
  series: { name: string, caseId?: string, points: [number, number][] }[]
}

/** The same quantity by a remembered or simpler formula, shown beside the value that is used. */
export interface ComparedValue {
  key: string
  /** What is compared, e.g. `Peak shear by the handbook polynomial`. */
  label: string
  used: number
  compared: number
  dimension: Dimension
  unit: UnitId
  /** Where the compared value comes from, and whether it is safe here. */
  source: string
}

export interface CalcResult {
  kind: string
  methodRevision: string
  outputs: Output[]
  /** Walls and cases of a section; empty for kinds that have none. */
  walls: WallRow[]
  cases: CaseRow[]
  /** The cases whose values other calculations may take whole: outputs `T@L04` for every head. Temperature in °C. */
  heads?: { id: string, title: string, source: string, level: LoadLevel, temperature: number | null }[]
  tables?: ResultTable[]
  plots?: Plot[]
  compared?: ComparedValue[]
  margins: MarginRow[]
  /** Key of the governing row in `margins`, or null when nothing is loaded. */
  governing: string | null
  guards: Guard[]
  working: WorkingStep[]
  drawing: Drawing | null
}

/** A fault of the inputs: where it is and what to do. */
export interface Fault { path: string, message: string }

export type Evaluation
  = | { ok: true, result: CalcResult }
    | { ok: false, faults: Fault[] }

/** One calculation kind. `inputs` is untrusted until `evaluate` has parsed it. */
export interface CalcKind<Inputs> {
  kind: string
  version: number
  /** `Open section` */
  title: string
  /** What it is for, in one sentence; shown where a kind is chosen. */
  about: string
  /** Takes longer than a keystroke may: the browser leaves it to the server. */
  heavy?: true
  /** A record of the note (a material, a table of load cases) and no calculation. */
  record?: true
  /** Reads the results of all other calculations, so that it is computed after them. */
  gathers?: true
  methodRevision: string
  /** zod schema of the stored inputs */
  schema: ZodType
  /** Inputs of a fresh calculation: valid JSON, sensible units, fields empty. */
  blank: () => Inputs
  /** Pure; never throws on bad inputs, never returns NaN or Infinity. */
  evaluate: (inputs: unknown, links?: Links) => Evaluation
}
