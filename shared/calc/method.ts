/** Revision of the torsion methods reference that the engine implements; answers lapse when it changes. */
export const METHOD_REVISION = 'A'
