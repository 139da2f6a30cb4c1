import type { Editor, NodeViewRenderer } from '@tiptap/core'
import type { Node } from '@tiptap/pm/model'
import type { NodeView, ViewMutationRecord } from '@tiptap/pm/view'
import { templateSection, type TemplateSection } from '#shared/note/template'
import type { Mount, Mounts } from '~/editor/mounts'
import { isUnwritten } from '~/editor/plugins/guidance'

/**
 * A section: its number hangs before its title, and its switch *not applicable*
 * stands at the right. A generated section shows what the page draws for it and
 * hides the empty paragraph the document holds.
 */
class SectionView implements NodeView {
  readonly dom = document.createElement('section')
  readonly contentDOM = document.createElement('div')
  private readonly head = document.createElement('div')
  private readonly aside = document.createElement('div')
  private readonly template: TemplateSection | undefined
  private mount: Mount | null = null

  constructor(private node: Node, private readonly editor: Editor, private readonly getPos: () => number | undefined, private readonly mounts: Mounts) {
    this.template = templateSection(String(node.attrs.key))
    this.dom.className = 'note-section'
    this.dom.id = `section-${String(node.attrs.key)}`
    this.dom.dataset.section = String(node.attrs.key)
    this.contentDOM.className = 'note-section-body'
    this.head.contentEditable = 'false'
    this.aside.contentEditable = 'false'
    this.aside.className = 'note-section-aside'
    this.dom.append(this.head, this.aside, this.contentDOM)
    this.drawHead()
    if (this.template?.generated) this.drawGenerated()
    else this.drawApplicable()
  }

  update(node: Node): boolean {
    if (node.type !== this.node.type || node.attrs.key !== this.node.attrs.key) return false
    const changed = node.attrs.notApplicable !== this.node.attrs.notApplicable
    this.node = node
    if (changed && !this.template?.generated) this.drawApplicable()
    return true
  }

  ignoreMutation(record: ViewMutationRecord): boolean {
    return record.type !== 'selection' && !this.contentDOM.contains(record.target)
  }

  stopEvent(event: Event): boolean {
    return event.target instanceof globalThis.Node && !this.contentDOM.contains(event.target)
  }

  destroy() {
    if (this.mount) this.mounts.remove(this.mount)
  }

  private drawHead() {
    const title = document.createElement('h2')
    title.className = 'note-section-title'
    const id = `title-${String(this.node.attrs.key)}`
    title.id = id
    const number = document.createElement('span')
    number.className = 'k'
    number.textContent = this.template?.number ?? ''
    const words = document.createElement('span')
    words.textContent = this.template?.title ?? String(this.node.attrs.key)
    title.append(number, words)
    this.dom.setAttribute('aria-labelledby', id)
    this.head.className = 'note-section-head'
    this.head.append(title)
  }

  private drawGenerated() {
    this.dom.classList.add('generated')
    this.contentDOM.hidden = true
    this.mount = this.mounts.add({ place: this.aside, component: 'generated', node: this.node, getPos: this.getPos, editor: this.editor })
  }

  private drawApplicable() {
    const reason = this.node.attrs.notApplicable as string | null
    // Text that was written before stays in sight: both together are refused at submission.
    this.contentDOM.hidden = reason !== null && isUnwritten(this.node)
    this.dom.classList.toggle('not-applicable', reason !== null)
    this.aside.replaceChildren(...(reason === null ? [] : this.reasonField(reason)))
    this.head.querySelector('button')?.remove()
    this.head.append(this.applicableVerb(reason))
  }

  private applicableVerb(reason: string | null): HTMLButtonElement {
    const verb = document.createElement('button')
    verb.type = 'button'
    verb.className = 't small writing-only'
    const title = this.template?.title ?? ''
    verb.textContent = reason === null ? 'Not applicable' : 'Write this section'
    verb.setAttribute('aria-label', reason === null ? `Mark ${title} not applicable` : `Write this section: ${title}`)
    verb.addEventListener('click', () => {
      this.setReason(reason === null ? '' : null)
      if (reason === null) this.aside.querySelector('textarea')?.focus()
    })
    return verb
  }

  /** The field while one writes and the sentence while one reads; the sheet's class shows one of them. */
  private reasonField(reason: string): HTMLElement[] {
    const label = document.createElement('label')
    label.className = 'not-applicable-reason writing-only'
    const words = document.createElement('span')
    words.textContent = 'Not applicable because'
    label.append(words)
    const text = document.createElement('p')
    text.className = 'reading-only'
    text.textContent = `Not applicable because ${reason}`
    const field = document.createElement('textarea')
    field.rows = 2
    field.value = reason
    field.maxLength = 1000
    field.setAttribute('aria-label', `${this.template?.title ?? ''} is not applicable because`)
    field.addEventListener('change', () => this.setReason(field.value.trim()))
    label.append(field)
    return [label, text]
  }

  private setReason(reason: string | null) {
    const pos = this.getPos()
    if (pos === undefined) return
    this.editor.view.dispatch(this.editor.state.tr.setNodeAttribute(pos, 'notApplicable', reason))
  }
}

export const sectionView = (mounts: Mounts): NodeViewRenderer =>
  ({ node, editor, getPos }) => new SectionView(node, editor, getPos, mounts)
