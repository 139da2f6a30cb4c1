/** Times as printed: days and minutes in UTC, whatever the machine's place. */
export const shownDay = (iso: string): string => iso.slice(0, 10)
export const shownTime = (iso: string): string => `${iso.slice(0, 10)} ${iso.slice(11, 16)} UTC`
