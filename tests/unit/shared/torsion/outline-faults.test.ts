/** A 1 % fault in any part of the outline solver is seen by the reference rows of outlines. */
import type { Exports, Mutation } from '../../../factories/engine-faults'
import { describeFaults, fault, result, scaled } from '../../../factories/engine-faults'
import { judgementRows, quickOutlineRows } from '../../../reference/outline-rows'

const at = (name: string): string => `torsion/outline/${name}`

/** The numbers of the named fields, or of the whole result, 1 % high where they are typed arrays. */
function arrays(name: string, ...fields: string[]) {
  return (all: Exports): Exports => {
    const original = all[name] as (...given: unknown[]) => Float64Array | Exports
    const raised = (values: Float64Array): Float64Array => values.map(value => fault * value)
    return {
      ...all, [name]: (...given: unknown[]) => {
        const sound = original(...given)
        if (sound instanceof Float64Array) return raised(sound)
        return { ...sound, ...Object.fromEntries(fields.map(field => [field, raised(sound[field] as Float64Array)])) }
      },
    }
  }
}

/** One limit of a table of tables 1 % high. */
const nested = (table: string, row: string, key: string) => (all: Exports): Exports => {
  const limits = all[table] as Record<string, Record<string, number>>
  return { ...all, [table]: { ...limits, [row]: { ...limits[row], [key]: (limits[row]?.[key] ?? 0) * fault } } }
}

const limits: Mutation[] = [
  ...['reentrantAbove', 'excludedDisc', 'leastOrder', 'agreementOfGamma', 'mostChi', 'stopFactor'].map((key): Mutation => ({ name: key, module: at('published'), spoil: scaled(key) })),
  ...(['J', 'tau'] as const).map((key): Mutation => ({ name: `accepted uncertainty of ${key}`, module: at('published'), spoil: all => ({ ...all, uncertaintyLimits: { ...(all.uncertaintyLimits as object), [key]: fault * ((all.uncertaintyLimits as Record<string, number>)[key] ?? 0) } }) })),
  ...([
    ['exact shape', 'J'], ['exact shape', 'tau'], ['open, corrected', 'J'], ['open, corrected', 'tau'], ['open, corrected', 'tau in a fillet'],
    ['open, mid-line only', 'J'], ['open, mid-line only', 'tau'], ['closed', 'J'], ['closed', 'tau'],
  ] as const).map(([row, key]): Mutation => ({ name: `expected difference: ${row}, ${key}`, module: at('published'), spoil: nested('agreementLimits', row, key) })),
]
const parts: Mutation[] = [
  { name: 'weights of the Gauss rule', module: at('gauss-legendre'), spoil: arrays('gaussLegendre', 'weights') },
  { name: 'nodes of the Gauss rule', module: at('gauss-legendre'), spoil: arrays('gaussLegendre', 'nodes') },
  { name: 'integrals against the logarithm', module: at('log-matrix'), spoil: arrays('logMatrix') },
  { name: 'lengths of boundary', module: at('panels'), spoil: arrays('panelMesh', 'w') },
  { name: 'x of the nodes', module: at('panels'), spoil: arrays('panelMesh', 'x') },
  { name: 'normals of the nodes', module: at('panels'), spoil: arrays('panelMesh', 'nx') },
  { name: 'shear at the nodes', module: at('boundary-shear'), spoil: arrays('boundaryShear', 'tau') },
  { name: 'stress function on the holes', module: at('boundary-shear'), spoil: arrays('boundaryShear', 'loopPhi') },
  { name: 'torsion constant by squares', module: at('torsion-constant'), spoil: result('constantFromSquares') },
  { name: 'torsion constant by the moment', module: at('torsion-constant'), spoil: result('constantFromMoment') },
  { name: 'warping along the boundary', module: at('warping-function'), spoil: arrays('warpingOnBoundary') },
  { name: 'moments of the warping', module: at('warping-function'), spoil: result('warpingMoments', 'x', 'y') },
  { name: 'shear centre', module: at('warping-function'), spoil: result('trefftzCentre', 'x', 'y') },
  { name: 'warping constant', module: at('warping-function'), spoil: result('warpingConstant') },
  { name: 'integrals along a panel', module: at('panel-polynomials'), spoil: arrays('panelPolynomials', 'integralTo') },
  { name: 'values along a panel', module: at('panel-polynomials'), spoil: arrays('panelPolynomials', 'valueAt') },
  { name: 'greatest shear', module: at('boundary-peaks'), spoil: result('boundaryPeaks', 'tau') },
  { name: 'exact area', module: at('outline-properties'), spoil: result('signedArea') },
  { name: 'exact moments', module: at('outline-properties'), spoil: result('propertiesOfEdges', 'A', 'Ixx', 'Iyy', 'Ip') },
  { name: 'value on three meshes', module: at('convergence'), spoil: result('estimateFromMeshes', 'value', 'uncertainty', 'order') },
  { name: 'thickness at a re-entrant vertex', module: at('reentrant'), spoil: result('reentrantVertices', 'excluded') },
]

describeFaults('a 1 % fault in a limit the outline solution is judged by', limits, judgementRows)
describeFaults('a 1 % fault in the outline solver', parts, [...quickOutlineRows, ...judgementRows])
