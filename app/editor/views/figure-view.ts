import type { NodeViewRenderer } from '@tiptap/core'
import type { Node } from '@tiptap/pm/model'
import type { NodeView } from '@tiptap/pm/view'

class FigureView implements NodeView {
  readonly dom = document.createElement('figure')
  private readonly image = document.createElement('img')
  private readonly caption = document.createElement('figcaption')

  constructor(private node: Node) {
    this.dom.className = 'note-figure'
    this.image.decoding = 'async'
    this.image.loading = 'lazy'
    this.dom.append(this.image, this.caption)
    this.draw()
  }

  update(node: Node): boolean {
    if (node.type !== this.node.type) return false
    this.node = node
    this.draw()
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

  private draw() {
    const src = `/files/${String(this.node.attrs.fileId)}`
    if (this.image.getAttribute('src') !== src) this.image.src = src
    this.image.alt = String(this.node.attrs.alt ?? '')
    this.caption.textContent = String(this.node.attrs.caption ?? '')
  }
}

export const figureView: NodeViewRenderer = ({ node }) => new FigureView(node)
