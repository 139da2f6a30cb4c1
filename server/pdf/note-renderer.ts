import { outlineOperators, type Glyph } from '#server/pdf/equation-glyphs'
import type { Equation } from '#server/pdf/equations'
import { TEXT } from '#server/pdf/fonts'
import type { PdfFont, PdfRef } from '#server/pdf/open-pdf'
import { Renderer } from '#server/pdf/pdfmake-parts'

/** A piece of a line of text. One with an `equation` stands for a drawing set in the line. */
export interface Inline { x: number, text: string, width: number, font: PdfFont, fontSize: number, color?: string, equation?: Equation }

export interface Line {
  inlines: Inline[]
  getHeight: () => number
  getAscenderHeight: () => number
  clone: () => Line
}

const COLOUR = '0.11 0.153 0.2 rg'
const n = (value: number) => String(Math.round(value * 10_000) / 10_000)

/** Draws pages as pdfmake does, and equations that stand in a line of text as vectors on its baseline. */
export class NoteRenderer extends Renderer {
  /** Outlines by their path: each is in the file once, however often it is set. */
  private readonly outlines = new Map<string, { name: string, form: PdfRef }>()

  override renderLine(line: Line, x: number, y: number): void {
    const equations = line.inlines.filter(inline => inline.equation)
    if (equations.length === 0) return super.renderLine(line, x, y)
    const text = line.clone()
    text.inlines = line.inlines.filter(inline => !inline.equation)
    // The remaining words keep the height and baseline that the equations gave the line.
    const [height, ascender] = [line.getHeight(), line.getAscenderHeight()]
    text.getHeight = () => height
    text.getAscenderHeight = () => ascender
    super.renderLine(text, x, y)
    for (const { equation, x: offset } of equations) {
      if (equation) this.drawEquation(equation, x + offset, y + ascender)
    }
  }

  /** The TeX stands behind the drawing as its text, so that it can be found and copied. */
  private drawEquation(equation: Equation, x: number, baseline: number): void {
    this.pdfDocument.markContent('Span', { actual: equation.tex })
    if (equation.glyphs) this.drawGlyphs(equation.glyphs, equation.size / 1000, x, baseline)
    else this.renderSVG({ svg: equation.svg(), x, y: baseline - equation.height + equation.depth, _width: equation.width, _height: equation.height, font: TEXT })
    this.pdfDocument.endMarkedContent()
  }

  /** pdfkit counts y downwards; the glyphs count it upwards from the baseline. */
  private drawGlyphs(glyphs: Glyph[], scale: number, x: number, baseline: number): void {
    const placed = glyphs.map((glyph) => {
      if (glyph.kind === 'bar') return `${n(glyph.x)} ${n(glyph.y)} ${n(glyph.width)} ${n(glyph.height)} re f`
      return `q ${n(glyph.scaleX)} 0 0 ${n(glyph.scaleY)} ${n(glyph.x)} ${n(glyph.y)} cm /${this.outline(glyph.path)} Do Q`
    })
    this.pdfDocument.addContent(`q ${n(scale)} 0 0 ${n(-scale)} ${n(x)} ${n(baseline)} cm ${COLOUR}\n${placed.join('\n')}\nQ`)
  }

  private outline(path: string): string {
    let outline = this.outlines.get(path)
    if (!outline) {
      const form = this.pdfDocument.ref({ Type: 'XObject', Subtype: 'Form', BBox: [-3000, -3000, 6000, 6000] })
      form.end(`${outlineOperators(path)}\nf`)
      outline = { name: `Q${this.outlines.size + 1}`, form }
      this.outlines.set(path, outline)
    }
    this.pdfDocument.page.xobjects[outline.name] = outline.form
    return outline.name
  }
}
