import 'pdfmake/interfaces'

/** Words of a definition that pdfmake knows and its types do not. */
declare module 'pdfmake/interfaces' {
  interface ContentBase {
    id?: string
    outline?: boolean
    outlineText?: string
    outlineId?: string
    outlineParentId?: string
  }
}
