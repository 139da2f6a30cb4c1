/** The engine as the reference rows use it: one object, so that a test can load it with a fault put into one of its parts. */
// Modules load one after another: side by side, a replaced module may be passed over.
export async function loadEngine() {
  const units = await import('#shared/units/units')
  const display = await import('#shared/units/display')
  const open = await import('#shared/torsion/open-section')
  const response = await import('#shared/torsion/response')
  const wall = await import('#shared/torsion/wall-stiffness')
  const sectorial = await import('#shared/torsion/sectorial')
  const corner = await import('#shared/torsion/corner-factor')
  const bend = await import('#shared/torsion/bend-factor')
  const junction = await import('#shared/torsion/junction-formula')
  const wagner = await import('#shared/torsion/wagner')
  const margins = await import('#shared/torsion/margins')
  const factors = await import('#shared/torsion/factors')
  const allowables = await import('#shared/torsion/allowables')
  const warping = await import('#shared/torsion/warping-length')
  const profiles = await import('#shared/torsion/profiles/section-of-profile')
  const solids = await import('#shared/torsion/solids/torsion-of-solid')
  const cells = await import('#shared/torsion/cells/torsion-of-cells')
  const cellWarping = await import('#shared/torsion/cells/cell-warping')
  const cellCorner = await import('#shared/torsion/cells/cell-corner')
  const shear = await import('#shared/torsion/shear/shear-flow')
  const warpingBar = await import('#shared/torsion/warping/warping-bar')
  const sectorialRun = await import('#shared/torsion/warping/sectorial-run')
  const stressPeaks = await import('#shared/torsion/warping/stress-peaks')
  const compression = await import('#shared/torsion/warping/compression')
  const cutBar = await import('#shared/torsion/warping/cut-bar')
  const span = await import('#shared/torsion/span/span-bar')
  const combined = await import('#shared/torsion/combined/interaction')
  const imposed = await import('#shared/torsion/imposed/imposed-twist')
  const stability = await import('#shared/torsion/stability/wall-stability')
  const outlineSolver = await import('#shared/torsion/outline/outline-torsion')
  const outlineCheck = await import('#shared/torsion/outline/outline-check')
  const outlineConvergence = await import('#shared/torsion/outline/convergence')
  const outlineAgreement = await import('#shared/torsion/outline/agreement')
  const outlineWalls = await import('#shared/torsion/outline/from-walls/outline-of-walls')
  const outlineVertices = await import('#shared/torsion/outline/reentrant')
  const outlineLimits = await import('#shared/torsion/outline/published')
  return { ...units, ...display, ...open, ...response, ...wall, ...sectorial, ...corner, ...bend, ...junction, ...wagner, ...margins, ...factors, ...allowables, ...warping, ...profiles, ...solids, ...cells, ...cellCorner, ...cellWarping, ...shear, ...warpingBar, ...sectorialRun, ...stressPeaks, ...compression, ...cutBar, ...span, ...combined, ...imposed, ...stability, ...outlineSolver, ...outlineCheck, ...outlineConvergence, ...outlineAgreement, ...outlineWalls, ...outlineVertices, ...outlineLimits }
}

export type Engine = Awaited<ReturnType<typeof loadEngine>>

/** The value, or an error that names the reason: a reference row never compares a refusal. */
export function given<T extends { ok: boolean }>(result: T): Extract<T, { ok: true }> {
  if (!result.ok) throw new Error(`Refused: ${JSON.stringify(result)}`)
  return result as Extract<T, { ok: true }>
}
