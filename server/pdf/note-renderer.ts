import rendererModule from 'pdfmake/js/Renderer.js'
import type { Equation } from '#server/pdf/equations'
import type { PdfFont } from '#server/pdf/open-pdf'

/** A piece of a line of text. One with an `equation` stands for a drawing set in the line. */
export interface Inline { x: number, text: string, width: number, font: PdfFont, fontSize: number, color?: string, equation?: Equation }

export interface Line {
  inlines: Inline[]
  getHeight: () => number
  getAscenderHeight: () => number
  clone: () => Line
}

const Renderer = rendererModule.default

/** Draws pages as pdfmake does, and equations that stand in a line of text as vectors on its baseline. */
export class NoteRenderer extends Renderer {
  override renderLine(line: Line, x: number, y: number): void {
    const equations = line.inlines.filter(inline => inline.equation)
    if (equations.length === 0) return super.renderLine(line, x, y)
    const text = line.clone()
    text.inlines = line.inlines.filter(inline => !inline.equation)
    // The remaining words keep the height and baseline that the equations gave the line.
    const height = line.getHeight()
    const ascender = line.getAscenderHeight()
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
    this.renderSVG({ svg: equation.svg, x, y: baseline - equation.height + equation.depth, _width: equation.width, _height: equation.height })
    this.pdfDocument.endMarkedContent()
  }
}
