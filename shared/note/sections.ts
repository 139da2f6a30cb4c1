import type { Node } from '@tiptap/pm/model'
import { blockText } from '#shared/note/block-text'
import { numberingOf } from '#shared/note/numbering'
import type { TemplateSection } from '#shared/note/template'
import { TEMPLATE, templateSection } from '#shared/note/template'

export interface NoteSection extends TemplateSection {
  id: string
  notApplicable: string | null
  /** Nothing but headings and white space. */
  empty: boolean
  pos: number
  node: Node
}

const GUIDANCE = new Set(TEMPLATE.map(section => section.guidance).filter(Boolean))
const CONTENT_ATOMS = new Set(['calculation', 'figure', 'equation', 'tied', 'inlineEquation'])

function hasContent(section: Node): boolean {
  let content = false
  section.descendants((node) => {
    if (CONTENT_ATOMS.has(node.type.name) || (node.isText && /\S/.test(node.text ?? ''))) content = true
    return !content && node.type.name !== 'heading'
  })
  return content
}

/** The sections of a note with what the template says of each. */
export function sectionsOf(doc: Node): NoteSection[] {
  const sections: NoteSection[] = []
  doc.forEach((node, pos) => {
    const template = templateSection(String(node.attrs.key))
    if (!template) return
    const notApplicable = typeof node.attrs.notApplicable === 'string' ? node.attrs.notApplicable : null
    sections.push({ ...template, id: String(node.attrs.id), notApplicable, empty: !hasContent(node), pos, node })
  })
  return sections
}

/** Why a section stands in the way of submission. */
export interface UnfinishedSection { sectionKey: string, blockId: string | null, problem: 'empty' | 'no-reason' | 'both' | 'guidance', message: string }

function guidanceLeft(section: NoteSection): UnfinishedSection[] {
  const left: UnfinishedSection[] = []
  section.node.descendants((node) => {
    if (!node.isTextblock) return true
    if (GUIDANCE.has(blockText(node).trim())) {
      left.push({ sectionKey: section.key, blockId: String(node.attrs.id), problem: 'guidance', message: `Section ${section.number}, ${section.title}, still holds its guidance text. Write over it.` })
    }
    return false
  })
  return left
}

function unfinished(section: NoteSection): UnfinishedSection[] {
  if (section.generated) return []
  const name = `Section ${section.number}, ${section.title},`
  const fault = (problem: UnfinishedSection['problem'], message: string): UnfinishedSection[] => [{ sectionKey: section.key, blockId: null, problem, message }]
  if (section.notApplicable !== null) {
    if (section.notApplicable.trim() === '') return fault('no-reason', `${name} is marked not applicable without a reason. Write the reason.`)
    return section.empty ? [] : fault('both', `${name} is marked not applicable but holds text. Remove the one or the other.`)
  }
  if (section.empty && section.required) return fault('empty', `${name} is empty. Write it, or mark it not applicable with the reason.`)
  return guidanceLeft(section)
}

/** Every section that keeps the issue from being submitted, in order. */
export const unfinishedSections = (doc: Node): UnfinishedSection[] => sectionsOf(doc).flatMap(unfinished)

export interface OutlineEntry {
  /** Id of the section or heading. */
  id: string
  kind: 'section' | 'heading'
  /** 0 for a section, 1 to 3 for a heading. */
  level: number
  number: string
  title: string
  sectionKey: string
  pos: number
  empty?: boolean
  generated?: boolean
  notApplicable?: boolean
}

/** Sections and headings with their numbers, for the outline and the contents of the PDF. `tied` gives the text of inline atoms. */
export function outlineOf(doc: Node, tied: (atom: Node) => string = () => '…'): OutlineEntry[] {
  const { headings } = numberingOf(doc)
  return sectionsOf(doc).flatMap((section) => {
    const entries: OutlineEntry[] = [{
      id: section.id, kind: 'section', level: 0, number: section.number, title: section.title, sectionKey: section.key, pos: section.pos,
      empty: section.empty, generated: section.generated, notApplicable: section.notApplicable !== null,
    }]
    section.node.forEach((node, offset) => {
      if (node.type.name !== 'heading') return
      const id = String(node.attrs.id)
      const title = node.textBetween(0, node.content.size, '', tied)
      entries.push({ id, kind: 'heading', level: Number(node.attrs.level), number: headings.get(id) ?? '', title, sectionKey: section.key, pos: section.pos + 1 + offset })
    })
    return entries
  })
}
