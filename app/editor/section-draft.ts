import { computed } from 'vue'
import type { OpenSectionInputs } from '#shared/calc/kinds/open-section/schema'
import { noLinks, type Links } from '#shared/calc/links'
import type { WallTable } from '#shared/calc/parts/wall-fields'
import { profileTable } from '#shared/calc/walls/profile-table'
import { readTyped } from '#shared/calc/walls/placed'
import { useCalcDraft } from '~/editor/calc-draft'
import { lengthUnit } from '~/editor/open-section-edits'
import { useResultsStore } from '~/stores/results'

/** The section of a calculation that stores a wall table: its walls as they lie now, whichever way they are given. */
export function useSectionDraft() {
  const draft = useCalcDraft()
  const results = useResultsStore()
  const inputs = computed(() => draft.inputs.value as WallTable & Pick<OpenSectionInputs, 'units' | 'materials' | 'profile'>)
  const unit = computed(() => lengthUnit(inputs.value))
  const links: Links = {
    ...noLinks,
    value: ({ calculation, key }) => {
      const output = results.outputOf(calculation, key)
      return output ? { ok: true, value: output.value, dimension: output.dimension } : { ok: false, reason: 'The source gives no value.' }
    },
  }
  /** Null while a profile gives no walls. */
  const table = computed<WallTable | null>(() => {
    const { profile, start, walls, junctions } = inputs.value
    return profile ? profileTable(profile, unit.value, links) : { start, walls, junctions }
  })
  return { draft, inputs, unit, table, links, read: readTyped(links) }
}
