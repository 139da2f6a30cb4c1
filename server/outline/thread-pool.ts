import type { Worker } from 'node:worker_threads'

export interface PoolLimits {
  threads: number
  /** Tasks that may wait; one more is refused. */
  mostWaiting: number
  /** Longest time a task may run once it has a thread, ms. */
  timeLimit: number
}

/** Why a task gave no answer: a stable code and what to do. */
export interface PoolRefusal { ok: false, code: 'busy' | 'too-long' | 'cancelled' | 'broken', reason: string }
export type PoolAnswer<Answer> = { ok: true, answer: Answer } | PoolRefusal

const refusals: Record<PoolRefusal['code'], string> = {
  'busy': 'Too many sections are being solved at present; try again in a minute.',
  'too-long': 'The section took too long to solve and was given up; leave out details that carry no torsion.',
  'cancelled': 'The solution was cancelled.',
  'broken': 'The solution ended without an answer; try again, and report it if it happens again.',
}
const refused = (code: PoolRefusal['code']): PoolRefusal => ({ ok: false, code, reason: refusals[code] })

interface Job<Task, Answer> { task: Task, settle: (answer: PoolAnswer<Answer>) => void }
interface Seat<Task, Answer> { worker: Worker, job: Job<Task, Answer> | null, timer: NodeJS.Timeout | null }

/**
 * Threads that take one task at a time and answer it with one message. A
 * thread is started when there is work for it and kept; one whose task is
 * given up is ended, since a computation cannot be interrupted otherwise.
 * Idle threads do not keep the process alive.
 */
export class ThreadPool<Task, Answer> {
  private readonly seats = new Set<Seat<Task, Answer>>()
  private readonly waiting: Job<Task, Answer>[] = []
  private closed = false

  constructor(private readonly start: () => Worker, private readonly limits: PoolLimits) {}

  /** Never rejects. Aborting frees the place in the queue, or the thread. */
  run(task: Task, signal?: AbortSignal): Promise<PoolAnswer<Answer>> {
    return new Promise((settle) => {
      if (this.closed || signal?.aborted) return settle(refused('cancelled'))
      if (this.load().running >= this.limits.threads && this.waiting.length >= this.limits.mostWaiting) return settle(refused('busy'))
      const abort = (): void => this.cancel(job)
      const job: Job<Task, Answer> = { task, settle: (given) => {
        signal?.removeEventListener('abort', abort)
        settle(given)
      } }
      signal?.addEventListener('abort', abort, { once: true })
      this.waiting.push(job)
      this.next()
    })
  }

  load(): { running: number, waiting: number } {
    return { running: [...this.seats].filter(({ job }) => job).length, waiting: this.waiting.length }
  }

  /** Ends every thread; what runs or waits is answered as cancelled. */
  async close(): Promise<void> {
    this.closed = true
    for (const job of this.waiting.splice(0)) job.settle(refused('cancelled'))
    await Promise.all([...this.seats].map(seat => this.discard(seat, refused('cancelled'))))
  }

  private next(): void {
    const job = this.waiting[0]
    const seat = job && ([...this.seats].find(one => !one.job) ?? (this.seats.size < this.limits.threads ? this.newSeat() : null))
    if (!job || !seat) return
    this.waiting.shift()
    seat.job = job
    seat.worker.ref()
    seat.timer = setTimeout(() => void this.discard(seat, refused('too-long')), this.limits.timeLimit)
    seat.worker.postMessage(job.task)
  }

  private newSeat(): Seat<Task, Answer> {
    const seat: Seat<Task, Answer> = { worker: this.start(), job: null, timer: null }
    const broken = (): void => void (this.seats.has(seat) && this.discard(seat, refused('broken')))
    seat.worker.on('message', (answer: Answer) => {
      this.settle(seat, { ok: true, answer })
      this.next()
    })
    seat.worker.on('error', broken)
    seat.worker.on('exit', broken)
    this.seats.add(seat)
    return seat
  }

  private settle(seat: Seat<Task, Answer>, given: PoolAnswer<Answer>): void {
    const { job, timer } = seat
    if (timer) clearTimeout(timer)
    seat.job = null
    seat.timer = null
    seat.worker.unref()
    job?.settle(given)
  }

  private async discard(seat: Seat<Task, Answer>, why: PoolRefusal): Promise<void> {
    this.seats.delete(seat)
    this.settle(seat, why)
    this.next()
    await seat.worker.terminate()
  }

  private cancel(job: Job<Task, Answer>): void {
    const place = this.waiting.indexOf(job)
    if (place >= 0) {
      this.waiting.splice(place, 1)
      job.settle(refused('cancelled'))
      return
    }
    const seat = [...this.seats].find(one => one.job === job)
    if (seat) void this.discard(seat, refused('cancelled'))
  }
}
