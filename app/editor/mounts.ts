import type { ShallowRef } from 'vue'
import { shallowReactive, shallowRef } from 'vue'
import type { Editor } from '@tiptap/core'
import type { Node } from '@tiptap/pm/model'

/**
 * Places in the document where a Vue component is shown. A node view makes the
 * place, the note's own component tree fills it by teleport: one Vue app, with
 * its stores, and no subscription of each block to every change of the selection.
 */
export interface Mount {
  key: string
  place: HTMLElement
  component: 'calculation' | 'generated'
  node: ShallowRef<Node>
  getPos: () => number | undefined
  editor: Editor
}

export class Mounts {
  /** Only what has come near the screen; once shown, it stays. */
  readonly shown = shallowReactive(new Map<string, Mount>())
  private readonly hidden = new Map<HTMLElement, Set<Mount>>()
  private readonly observer: IntersectionObserver | null
  private count = 0

  constructor() {
    this.observer = typeof IntersectionObserver === 'undefined'
      ? null
      : new IntersectionObserver(entries => entries.filter(entry => entry.isIntersecting).forEach(entry => this.reveal(entry.target)), { rootMargin: '900px 0px' })
  }

  add(mount: Omit<Mount, 'key' | 'node'> & { node: Node }): Mount {
    const { node, ...rest } = mount
    const made: Mount = { ...rest, key: `m${this.count++}`, node: shallowRef(node) }
    if (!this.observer) {
      this.shown.set(made.key, made)
      return made
    }
    // Sections are observed, not blocks: a note has twenty of the one and hundreds of the other.
    queueMicrotask(() => this.wait(made))
    return made
  }

  remove(mount: Mount) {
    this.shown.delete(mount.key)
    for (const waiting of this.hidden.values()) waiting.delete(mount)
  }

  destroy() {
    this.observer?.disconnect()
    this.shown.clear()
  }

  private wait(mount: Mount) {
    const section = mount.place.closest<HTMLElement>('.note-section')
    if (!section) {
      this.shown.set(mount.key, mount)
      return
    }
    const waiting = this.hidden.get(section) ?? new Set<Mount>()
    this.hidden.set(section, waiting.add(mount))
    this.observer?.unobserve(section)
    this.observer?.observe(section)
  }

  private reveal(target: Element) {
    if (!(target instanceof HTMLElement)) return
    for (const mount of this.hidden.get(target) ?? []) this.shown.set(mount.key, mount)
    this.hidden.delete(target)
    this.observer?.unobserve(target)
  }
}
