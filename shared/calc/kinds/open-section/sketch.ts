import type { Drawing } from '#shared/calc/types'
import type { Solution } from '#shared/calc/kinds/open-section/solution'

export const openSectionSketch = (_: Solution): Drawing | null => null
