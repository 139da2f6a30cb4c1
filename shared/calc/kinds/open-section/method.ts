/** Revision of the torsion methods reference that this kind follows; answers lapse when it changes. */
export const METHOD_REVISION = 'A'
