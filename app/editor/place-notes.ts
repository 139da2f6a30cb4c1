export interface Wanted { id: string, y: number, height: number }
export interface Placed { id: string, top: number, /** How far the note was pushed from its anchor: negative is below it. */ dy: number }

/**
 * Puts the notes of the side column at the height of their anchors, in the
 * order of the text. One that would cover the note above is pushed down, and
 * none stands beside a calculation that is open over the whole sheet.
 */
export function placeNotes(wanted: readonly Wanted[], taken: readonly { top: number, bottom: number }[] = [], gap = 14, from = 0): Placed[] {
  let free = from
  return wanted.map(({ id, y, height }) => {
    let top = Math.max(y, free)
    for (const block of taken) if (top < block.bottom && top + height > block.top) top = block.bottom + gap
    free = top + height + gap
    return { id, top, dy: y - top }
  })
}
