import { createRequire } from 'node:module'
import { dirname, join } from 'node:path'

/** Family names used in definitions. */
export const TEXT = 'Source Serif'

// Through the package and not by a path beside this file, so that the bundled worker finds them as well.
const folder = dirname(createRequire(import.meta.url).resolve('@expo-google-fonts/source-serif-4/package.json'))
const face = (style: string) => join(folder, style, `SourceSerif4_${style}.ttf`)

/** TrueType faces for pdfmake: full ones, because subsets for the web lack Greek, ≤ and ligatures. `bold` is the semibold cut. */
export function fontFaces(): Record<string, { normal: string, bold: string, italics: string, bolditalics: string }> {
  return {
    [TEXT]: { normal: face('400Regular'), bold: face('600SemiBold'), italics: face('400Regular_Italic'), bolditalics: face('600SemiBold_Italic') },
  }
}
