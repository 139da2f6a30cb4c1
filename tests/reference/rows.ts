/** All reference rows the engine is held to. */
import type { ReferenceRow } from './row'
import { provenBy } from './row'
import { cellRows } from './cell-rows'
import { outlineRows } from './outline-rows'
import { profileRows } from './profile-rows'
import { programRows } from './program-rows'
import { sectorialRows } from './sectorial-rows'
import { solidRows } from './solid-rows'
import { spanRows } from './span-rows'
import { stabilityRows } from './stability-rows'
import { torsionRows } from './torsion-rows'
import { unitRows } from './unit-rows'
import { wallsOutlineRows } from './walls-outline-rows'
import { warpingRows } from './warping-rows'

export const referenceRows: readonly ReferenceRow[] = [...torsionRows, ...profileRows, ...solidRows, ...cellRows, ...warpingRows, ...spanRows, ...stabilityRows, ...sectorialRows, ...programRows, ...unitRows, ...provenBy('4.1', outlineRows), ...provenBy('4.1', wallsOutlineRows)]
