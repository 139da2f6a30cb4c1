import { defineStore } from 'pinia'
import { reactive } from 'vue'

export type SavePhase = 'saved' | 'unsent' | 'saving' | 'offline' | 'failed' | 'conflict'

export interface SaveState {
  phase: SavePhase
  /** Number of the last save the server confirmed. */
  save: number
  savedAt: string | null
  /** Changes that are only on this machine. */
  unsent: number
  /** Since when there is no connection. */
  since: string | null
  /** Why the server refused, in its own sentence. */
  message: string | null
}

/** What the strip says about saving; the saver writes it, the screen reads it. */
export const useSaveStore = defineStore('save', () => {
  const state = reactive<SaveState>({ phase: 'saved', save: 0, savedAt: null, unsent: 0, since: null, message: null })
  function set(next: Partial<SaveState>) {
    Object.assign(state, next)
  }
  return { state, set }
})
