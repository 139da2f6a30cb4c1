import { effectScope, watchEffect, type EffectScope } from 'vue'
import type { NodeViewRenderer } from '@tiptap/core'
import type { Node } from '@tiptap/pm/model'
import type { NodeView } from '@tiptap/pm/view'

export interface TiedText { number: string, unit: string, label: string, missing: boolean }
export type ReadTied = (calcId: string, key: string, unit: string | null) => TiedText

/** A value that follows its calculation: it reads the store, and no transaction is made when the value moves. */
class TiedView implements NodeView {
  readonly dom = document.createElement('span')
  private scope: EffectScope | null = null

  constructor(private node: Node, private readonly read: ReadTied) {
    this.follow()
  }

  update(node: Node): boolean {
    if (node.type !== this.node.type) return false
    this.node = node
    this.follow()
    return true
  }

  selectNode() {
    this.dom.classList.add('on')
  }

  deselectNode() {
    this.dom.classList.remove('on')
  }

  ignoreMutation(): boolean {
    return true
  }

  destroy() {
    this.scope?.stop()
  }

  private follow() {
    this.scope?.stop()
    this.scope = effectScope(true)
    this.scope.run(() => watchEffect(() => this.draw()))
  }

  private draw() {
    const { calcId, key, unit } = this.node.attrs as { calcId: string, key: string, unit: string | null }
    const text = this.read(calcId, key, unit)
    this.dom.className = `tied${text.missing ? ' missing' : ''}${this.dom.classList.contains('on') ? ' on' : ''}`
    this.dom.dataset.calcId = calcId
    this.dom.dataset.key = key
    this.dom.title = text.label
    const words = document.createElement('span')
    words.textContent = text.number
    const unitWords = document.createElement('span')
    unitWords.className = 'u'
    unitWords.textContent = text.unit
    this.dom.replaceChildren(words, unitWords)
  }
}

export const tiedView = (read: ReadTied): NodeViewRenderer => ({ node }) => new TiedView(node, read)
