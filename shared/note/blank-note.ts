import { TEMPLATE } from '#shared/note/template'

/** The document of a fresh note as JSON: every section of the template with one empty paragraph. */
export function blankDocument(newId: () => string) {
  return {
    type: 'doc',
    content: TEMPLATE.map(section => ({
      type: 'section',
      attrs: { id: newId(), key: section.key, notApplicable: null },
      content: [{ type: 'paragraph', attrs: { id: newId() } }],
    })),
  }
}
