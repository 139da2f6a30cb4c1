import type { Node } from '@tiptap/pm/model'
import { canonicalJson } from '#shared/note/canonical'

/** SHA-256 of the canonical text of a document, as the server makes it. */
export async function docHash(doc: Node): Promise<string> {
  const bytes = new TextEncoder().encode(canonicalJson(doc.toJSON()))
  const digest = await crypto.subtle.digest('SHA-256', bytes)
  return [...new Uint8Array(digest)].map(byte => byte.toString(16).padStart(2, '0')).join('')
}
