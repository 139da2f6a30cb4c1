/** The server's clock: the only source of times that are stored. */
export const serverClock = (): Date => new Date()
