import katex from 'katex'
import type { Editor, NodeViewRenderer } from '@tiptap/core'
import type { Node } from '@tiptap/pm/model'
import { NodeSelection } from '@tiptap/pm/state'
import type { NodeView } from '@tiptap/pm/view'
import { panelPlace, showPanel } from '~/editor/panels'
import { isReading } from '~/editor/plugins/reading'

/** Sets TeX; what KaTeX cannot read is shown as typed, with its own reason, never thrown. */
export function setTex(place: HTMLElement, tex: string, displayMode: boolean) {
  katex.render(tex, place, { displayMode, output: 'htmlAndMathml', trust: false, throwOnError: false, maxExpand: 200, maxSize: 20, strict: 'ignore' })
}

class EquationView implements NodeView {
  readonly dom: HTMLElement

  constructor(private node: Node, private readonly editor: Editor, private readonly getPos: () => number | undefined) {
    this.dom = document.createElement(this.inline ? 'span' : 'div')
    this.dom.className = this.inline ? 'note-tex' : 'note-equation'
    this.dom.addEventListener('dblclick', () => this.open())
    this.draw()
  }

  update(node: Node): boolean {
    if (node.type !== this.node.type) return false
    const changed = node.attrs.tex !== this.node.attrs.tex
    this.node = node
    if (changed) this.draw()
    return true
  }

  selectNode() {
    this.dom.classList.add('selected')
  }

  deselectNode() {
    this.dom.classList.remove('selected')
  }

  ignoreMutation(): boolean {
    return true
  }

  private get inline() {
    return this.node.isInline
  }

  private draw() {
    const tex = String(this.node.attrs.tex)
    if (tex.trim()) setTex(this.dom, tex, !this.inline)
    else this.dom.textContent = 'empty equation'
  }

  private open() {
    const pos = this.getPos()
    if (pos === undefined || isReading(this.editor.state)) return
    const { state, view } = this.editor
    const tr = state.tr.setSelection(NodeSelection.create(state.doc, pos))
    view.dispatch(showPanel(tr, { panel: { kind: 'equation', pos, inline: this.inline }, at: panelPlace(state, pos) }))
  }
}

export const equationView: NodeViewRenderer = ({ node, editor, getPos }) => new EquationView(node, editor, getPos)
