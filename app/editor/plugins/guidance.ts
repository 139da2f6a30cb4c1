import type { Node } from '@tiptap/pm/model'
import { Plugin, PluginKey } from '@tiptap/pm/state'
import { Decoration, DecorationSet } from '@tiptap/pm/view'
import { templateSection } from '#shared/note/template'

/** A written section that holds nothing but one empty paragraph. */
export function isUnwritten(section: Node): boolean {
  const only = section.childCount === 1 ? section.firstChild : null
  return only !== null && only.type.name === 'paragraph' && only.content.size === 0
}

const key = new PluginKey<DecorationSet>('guidance')

function guide(doc: Node): DecorationSet {
  const decorations: Decoration[] = []
  doc.forEach((section, pos) => {
    const template = templateSection(String(section.attrs.key))
    if (!template?.guidance || section.attrs.notApplicable !== null || !isUnwritten(section)) return
    decorations.push(Decoration.node(pos + 1, pos + 1 + (section.firstChild?.nodeSize ?? 0), { 'class': 'unwritten', 'data-guidance': template.guidance }))
  })
  return DecorationSet.create(doc, decorations)
}

/** What an empty section asks for. It is drawn, never stored, and goes with the first letter. */
export function guidance(): Plugin<DecorationSet> {
  return new Plugin<DecorationSet>({
    key,
    state: {
      init: (_config, state) => guide(state.doc),
      apply: (tr, shown) => (tr.docChanged ? guide(tr.doc) : shown),
    },
    props: { decorations: state => key.getState(state) },
  })
}
