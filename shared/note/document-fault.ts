/** Why a document or its steps are refused. */
export type DocumentFaultCode
  = | 'document.too-large' | 'document.too-deep' | 'document.too-many-nodes' | 'document.too-much-text' | 'document.too-many-calculations'
    | 'document.malformed' | 'document.attribute' | 'document.schema' | 'document.id' | 'document.sections'
    | 'steps.malformed' | 'steps.too-many' | 'steps.do-not-apply'

export interface DocumentFault {
  ok: false
  code: DocumentFaultCode
  /** A sentence for the person. */
  message: string
  /** Where, e.g. `content.3.content.0.attrs.tex`. */
  path: string
}

export const documentFault = (code: DocumentFaultCode, message: string, path = ''): DocumentFault => ({ ok: false, code, message, path })
