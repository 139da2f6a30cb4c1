import type { WorkingStep } from '#shared/calc/types'
import type { Solution } from '#shared/calc/kinds/open-section/solution'

export const openSectionWorking = (_: Solution): WorkingStep[] => []
