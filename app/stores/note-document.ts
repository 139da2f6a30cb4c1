import type { Editor } from '@tiptap/core'
import type { Node } from '@tiptap/pm/model'
import { defineStore } from 'pinia'
import { computed, ref, shallowRef } from 'vue'
import { calculationsOf } from '#shared/note/calculations'
import { outlineOf } from '#shared/note/sections'

/** What the screen derives from the document in the editor, and which part of it is open. */
export const useNoteDocumentStore = defineStore('note-document', () => {
  const doc = shallowRef<Node | null>(null)
  const editor = shallowRef<Editor | null>(null)
  const editable = ref(false)
  /** The one calculation that is open. */
  const openCalc = ref<string | null>(null)
  const calculations = computed(() => (doc.value ? calculationsOf(doc.value) : []))
  const outline = computed(() => (doc.value ? outlineOf(doc.value) : []))
  function labelOf(calcId: string): string {
    return calculations.value.find(each => each.id === calcId)?.label ?? '?'
  }
  function titleOf(calcId: string): string {
    return calculations.value.find(each => each.id === calcId)?.title ?? ''
  }
  /** `C2 Hat section` */
  function nameOf(calcId: string): string {
    return `${labelOf(calcId)} ${titleOf(calcId)}`.trim()
  }
  return { doc, editor, editable, openCalc, calculations, outline, labelOf, titleOf, nameOf }
})
