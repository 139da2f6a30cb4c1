import type { Editor, NodeViewRenderer } from '@tiptap/core'
import type { Node } from '@tiptap/pm/model'
import type { NodeView } from '@tiptap/pm/view'
import type { Mount, Mounts } from '~/editor/mounts'

/** The place of a calculation in the text. Its face is a component; the document holds only its inputs. */
class CalculationView implements NodeView {
  readonly dom = document.createElement('div')
  private readonly mount: Mount

  constructor(private node: Node, editor: Editor, getPos: () => number | undefined, private readonly mounts: Mounts) {
    this.dom.className = 'note-calc'
    this.dom.contentEditable = 'false'
    this.dom.id = `calc-${String(node.attrs.id)}`
    this.dom.dataset.calc = String(node.attrs.id)
    this.mount = mounts.add({ place: this.dom, component: 'calculation', node, getPos, editor })
  }

  update(node: Node): boolean {
    if (node.type !== this.node.type || node.attrs.id !== this.node.attrs.id) return false
    this.node = node
    this.mount.node.value = node
    return true
  }

  selectNode() {
    this.dom.classList.add('selected')
  }

  deselectNode() {
    this.dom.classList.remove('selected')
  }

  /** What happens in fields and on buttons is the form's own; a press beside them selects the block. */
  stopEvent(event: Event): boolean {
    if (event.type.startsWith('drag') || event.type === 'drop') return false
    return event.target instanceof Element && event.target.closest('input, textarea, select, button, a, summary, [data-own-events]') !== null
  }

  ignoreMutation(): boolean {
    return true
  }

  destroy() {
    this.mounts.remove(this.mount)
  }
}

export const calculationView = (mounts: Mounts): NodeViewRenderer =>
  ({ node, editor, getPos }) => new CalculationView(node, editor, getPos, mounts)
