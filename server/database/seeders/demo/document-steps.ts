import { createHash } from 'node:crypto'
import { Slice, type Node } from '@tiptap/pm/model'
import { ReplaceStep } from '@tiptap/pm/transform'
import { canonicalJson } from '#shared/note/canonical'
import { readDocument } from '#shared/note/schema'

export interface DocumentChange { steps: Record<string, unknown>[], docHash: string }

/** How far the child of that number lies from the start of its parent's content. */
function offsetOf(node: Node, child: number): number {
  let offset = 0
  for (let index = 0; index < child; index += 1) offset += node.child(index).nodeSize
  return offset
}

/** How many children are equal from the front, then from the back. */
function sharedEnds(old: Node, written: Node): { head: number, tail: number } {
  const least = Math.min(old.childCount, written.childCount)
  let head = 0
  while (head < least && old.child(head).eq(written.child(head))) head += 1
  let tail = 0
  while (tail < least - head && old.child(old.childCount - 1 - tail).eq(written.child(written.childCount - 1 - tail))) tail += 1
  return { head, tail }
}

/** One step that turns the section at `start` into the written one: only the blocks that differ, or the whole where its own marks do. */
function sectionStep(old: Node, written: Node, start: number): ReplaceStep {
  if (!old.sameMarkup(written)) {
    const whole = written.type.schema.topNodeType.create(null, [written])
    return new ReplaceStep(start, start + old.nodeSize, new Slice(whole.content, 0, 0))
  }
  const { head, tail } = sharedEnds(old, written)
  const inside = written.content.cut(offsetOf(written, head), offsetOf(written, written.childCount - tail))
  return new ReplaceStep(start + 1 + offsetOf(old, head), start + 1 + offsetOf(old, old.childCount - tail), new Slice(inside, 0, 0))
}

/**
 * The editing steps that lead from one stored document to another, as the
 * editor would send them: one per changed section, the last section first, so
 * that anchors in what did not change stay where they are.
 */
export function changeBetween(before: unknown, after: unknown): DocumentChange {
  const from = readDocument(before)
  const to = readDocument(after)
  if (from.childCount !== to.childCount) throw new Error('Both documents must have the sections of the template')
  const steps: Record<string, unknown>[] = []
  for (let index = from.childCount - 1; index >= 0; index -= 1) {
    const [old, written] = [from.child(index), to.child(index)]
    if (!old.eq(written)) steps.push(sectionStep(old, written, offsetOf(from, index)).toJSON() as Record<string, unknown>)
  }
  return { steps, docHash: createHash('sha256').update(canonicalJson(to.toJSON())).digest('hex') }
}
