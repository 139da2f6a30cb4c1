import type { Node } from '@tiptap/pm/model'
import type { Step } from '@tiptap/pm/transform'
import type { SaveAnswer } from '#shared/schemas/issue-view'
import type { SaveState } from '~/stores/save'
import { StepQueue } from '~/editor/step-queue'

export interface Batch { baseSave: number, steps: unknown[], docHash: string, key: string }

export type Sent
  = | { kind: 'stored', answer: SaveAnswer }
    | { kind: 'no-connection' }
    | { kind: 'conflict', message: string }
    | { kind: 'refused', message: string }

/** What the saver needs from its surroundings; a test gives it a clock and a server of its own. */
export interface SaverPort {
  send: (batch: Batch) => Promise<Sent>
  hash: (doc: Node) => Promise<string>
  newKey: () => string
  now: () => Date
  /** Keeps the steps on this machine; with null, forgets them. */
  keep: (kept: { baseSave: number, steps: unknown[] } | null) => void
  show: (state: Partial<SaveState>) => void
  stored: (answer: SaveAnswer, doc: Node, newer: boolean) => void
  conflict: (message: string) => void
  later: (run: () => void, ms: number) => number
  cancel: (timer: number) => void
}

const IDLE = 1_000
const LONGEST = 10_000
const RETRY = [1_000, 2_000, 4_000, 8_000, 15_000, 30_000]

/**
 * Sends the steps of the editor as saves, one batch at a time: a second after
 * the last change, ten seconds after the first one at the latest, and at once
 * when asked. A batch that may have arrived is sent again under the same key,
 * so that it is stored once. After a conflict or a refusal it stands still: the
 * steps are kept, and the person decides.
 */
export class Saver {
  private readonly queue = new StepQueue()
  private batch: (Batch & { doc: Node }) | null = null
  private idleTimer: number | null = null
  private longestTimer: number | null = null
  private failures = 0
  private stopped = false
  private running: Promise<void> | null = null

  constructor(private readonly port: SaverPort, private base: number, private doc: Node) {}

  get baseSave(): number {
    return this.base
  }

  get unsent(): number {
    return this.queue.size
  }

  /** Steps that no save holds, oldest first. */
  steps(): Step[] {
    return this.queue.all()
  }

  changed(steps: readonly Step[], doc: Node) {
    this.doc = doc
    this.queue.add(steps)
    this.keep()
    if (this.stopped) return
    this.port.show({ unsent: this.queue.size, ...(this.failures ? {} : { phase: 'unsent' }) })
    if (this.idleTimer !== null) this.port.cancel(this.idleTimer)
    this.idleTimer = this.port.later(() => void this.flush(), IDLE)
    this.longestTimer ??= this.port.later(() => void this.flush(), LONGEST)
  }

  /** Sends everything now. True when nothing is left unsent. */
  async flush(): Promise<boolean> {
    this.cancelTimers()
    while (!this.stopped && !this.queue.idle) {
      const before = this.failures
      this.running ??= this.sendOne().finally(() => {
        this.running = null
      })
      await this.running
      if (this.failures > before) break
    }
    return this.queue.idle
  }

  /** Stops sending for good; what is unsent stays kept. */
  stop() {
    this.stopped = true
    this.cancelTimers()
  }

  /** Sends again after a refusal whose cause may be gone, such as a session that had ended. */
  async resume(): Promise<boolean> {
    this.stopped = false
    return this.flush()
  }

  /** Drops what is unsent, after the person has taken it elsewhere. */
  drop() {
    this.stop()
    this.queue.clear()
    this.port.keep(null)
  }

  private async sendOne() {
    this.batch ??= await this.makeBatch()
    const batch = this.batch
    this.port.show({ phase: 'saving' })
    const { doc, ...body } = batch
    const sent = await this.port.send(body)
    if (sent.kind === 'stored') this.arrived(sent.answer, doc)
    else if (sent.kind === 'no-connection') this.noConnection()
    else this.standStill(sent)
  }

  private async makeBatch(): Promise<Batch & { doc: Node }> {
    const doc = this.doc
    const steps = this.queue.depart().map(step => step.toJSON() as unknown)
    return { baseSave: this.base, steps, docHash: await this.port.hash(doc), key: this.port.newKey(), doc }
  }

  private arrived(answer: SaveAnswer, doc: Node) {
    this.queue.arrived()
    this.batch = null
    this.failures = 0
    this.base = answer.save
    this.keep()
    this.port.show({ phase: this.queue.idle ? 'saved' : 'unsent', save: answer.save, savedAt: answer.savedAt, unsent: this.queue.size, since: null, message: null })
    this.port.stored(answer, doc, !this.queue.idle)
  }

  private noConnection() {
    if (!this.failures) this.port.show({ since: this.port.now().toISOString() })
    this.port.show({ phase: 'offline', unsent: this.queue.size })
    const wait = RETRY[Math.min(this.failures, RETRY.length - 1)] ?? IDLE
    this.failures += 1
    this.idleTimer = this.port.later(() => void this.flush(), wait)
  }

  private standStill(sent: { kind: 'conflict' | 'refused', message: string }) {
    this.queue.turnedBack()
    this.batch = null
    this.stop()
    this.keep()
    this.port.show({ phase: sent.kind === 'conflict' ? 'conflict' : 'failed', message: sent.message, unsent: this.queue.size })
    if (sent.kind === 'conflict') this.port.conflict(sent.message)
  }

  private keep() {
    const steps = this.queue.all()
    this.port.keep(steps.length ? { baseSave: this.base, steps: steps.map(step => step.toJSON() as unknown) } : null)
  }

  private cancelTimers() {
    for (const timer of [this.idleTimer, this.longestTimer]) if (timer !== null) this.port.cancel(timer)
    this.idleTimer = null
    this.longestTimer = null
  }
}
