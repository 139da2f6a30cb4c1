/** Which sections of a note are written when: analysts begin with what is given, and end with what they conclude. */
import type { DemoSection } from './build-document'

export const only = (sections: DemoSection[], ...keys: string[]): DemoSection[] => sections.filter(one => keys.includes(one.key))

export const SET_UP = ['scope', 'references', 'description', 'assumptions']
/** The texts of the data are tied to the calculations, so these come with them. */
export const DATA = ['section-analysis', 'geometry', 'materials', 'loads']
export const ANALYSIS = ['span-analysis', 'stresses', 'stability', 'deflections']
