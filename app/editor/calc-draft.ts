import { closeHistory } from '@tiptap/pm/history'
import { computed, inject, provide, shallowRef, watch, type ComputedRef, type InjectionKey, type ShallowRef } from 'vue'
import { evaluateNote } from '#shared/calc/evaluate-note'
import type { NoteCalc } from '#shared/calc/note-links'
import { calcKind, isCalcKind } from '#shared/calc/registry'
import type { Evaluation, Fault } from '#shared/calc/types'
import type { Mount } from '~/editor/mounts'
import { getIn, setIn } from '~/editor/path'
import { useNoteDocumentStore } from '~/stores/note-document'
import { useResultsStore } from '~/stores/results'

/**
 * Inputs of one calculation while they are typed. Typing changes the draft and
 * the preview only; a committed field is one step of the document, so that undo
 * goes field by field and a save never holds half a number.
 */
export interface CalcDraft {
  calcId: string
  kind: string
  inputs: ShallowRef<unknown>
  editable: ComputedRef<boolean>
  dirty: ComputedRef<boolean>
  faults: ComputedRef<Fault[]>
  read: (path: string) => unknown
  /** The draft changes, the document does not. */
  set: (path: string, value: unknown) => void
  /** The draft becomes one step of the document. */
  commit: () => void
  /** Change and commit in one: for choices, new rows, removed rows. */
  put: (path: string, value: unknown) => void
  revert: () => void
}

const key: InjectionKey<CalcDraft> = Symbol('calculation draft')

export function provideCalcDraft(mount: Mount, editable: ComputedRef<boolean>): CalcDraft {
  const results = useResultsStore()
  const note = useNoteDocumentStore()
  const node = mount.node
  const calcId = String(node.value.attrs.id)
  const inputs = shallowRef<unknown>(node.value.attrs.inputs)
  const faulty = shallowRef<Evaluation | null>(null)
  let scheduled = 0

  /** This calculation and whatever depends on it; one that takes longer than a keystroke waits for the server. */
  function preview() {
    scheduled = 0
    const kind = String(node.value.attrs.kind)
    if (isCalcKind(kind) && calcKind(kind).heavy) return
    const before = { byId: new Map(note.calculations.map(each => [each.id, each])), results: results.all(), sameInputs: (each: NoteCalc) => each.id !== calcId }
    const now = note.calculations.map(each => (each.id === calcId ? { ...each, inputs: inputs.value } : each))
    for (const [id, evaluation] of Object.entries(evaluateNote(now, before).results)) {
      if (id === calcId) faulty.value = evaluation
      if (id === calcId || evaluation !== before.results[id]) results.setPreview(id, evaluation)
    }
  }
  // Several keys within one frame are one evaluation.
  function previewSoon() {
    if (!scheduled) scheduled = requestAnimationFrame(preview)
  }
  function set(path: string, value: unknown) {
    inputs.value = setIn(inputs.value, path, value)
    previewSoon()
  }
  function commit() {
    const pos = mount.getPos()
    if (pos === undefined || inputs.value === node.value.attrs.inputs) return
    mount.editor.view.dispatch(closeHistory(mount.editor.state.tr).setNodeAttribute(pos, 'inputs', inputs.value))
  }
  function put(path: string, value: unknown) {
    set(path, value)
    commit()
  }
  function revert() {
    if (inputs.value === node.value.attrs.inputs) return
    inputs.value = node.value.attrs.inputs
    previewSoon()
  }
  watch(node, (now) => {
    if (now.attrs.inputs === inputs.value) return
    inputs.value = now.attrs.inputs
  })
  const draft: CalcDraft = {
    calcId, kind: String(node.value.attrs.kind), inputs, editable, set, commit, put, revert,
    dirty: computed(() => inputs.value !== node.value.attrs.inputs),
    faults: computed(() => {
      const evaluation = results.evaluationOf(calcId) ?? faulty.value
      return evaluation && !evaluation.ok ? evaluation.faults : []
    }),
    read: path => getIn(inputs.value, path),
  }
  provide(key, draft)
  return draft
}

export function useCalcDraft(): CalcDraft {
  const draft = inject(key)
  if (!draft) throw new Error('A field of a calculation stands outside one')
  return draft
}
