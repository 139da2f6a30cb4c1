import type { Step } from '@tiptap/pm/transform'

/**
 * Steps that the server has not confirmed: those under way in one batch, and
 * those made since. Neighbouring steps are merged, so that a typed sentence is
 * one step; a batch under way is never touched, since it may have arrived.
 */
export class StepQueue {
  private waiting: Step[] = []
  private underWay: readonly Step[] = []

  get size(): number {
    return this.waiting.length + this.underWay.length
  }

  get idle(): boolean {
    return this.size === 0
  }

  get hasWaiting(): boolean {
    return this.waiting.length > 0
  }

  add(steps: readonly Step[]) {
    for (const step of steps) {
      const merged = this.waiting.at(-1)?.merge(step) ?? null
      if (merged) this.waiting[this.waiting.length - 1] = merged
      else this.waiting.push(step)
    }
  }

  /** Takes what waits into a batch. While one is under way, the same batch again. */
  depart(): readonly Step[] {
    if (!this.underWay.length) {
      this.underWay = this.waiting
      this.waiting = []
    }
    return this.underWay
  }

  /** The batch is stored. */
  arrived() {
    this.underWay = []
  }

  /** The batch certainly did not arrive: it waits again, before what came after it. */
  turnedBack() {
    this.waiting = [...this.underWay, ...this.waiting]
    this.underWay = []
  }

  all(): Step[] {
    return [...this.underWay, ...this.waiting]
  }

  clear() {
    this.waiting = []
    this.underWay = []
  }
}
