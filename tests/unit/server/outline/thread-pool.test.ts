import { Worker } from 'node:worker_threads'
import { afterEach, describe, expect, it } from 'vitest'
import { evaluateGeneralOutline } from '#shared/calc/kinds/general-outline/evaluate'
import { prepareOutlines } from '#server/outline/prepare-outlines'
import { ThreadPool } from '#server/outline/thread-pool'
import { closeOutlinePool, solveOutline } from '#server/outline/solve-outline'
import { outlineTorsion } from '#shared/torsion/outline/outline-torsion'
import { sharpBracketInputs, thickAngleInputs } from '../../../factories/general-outline'
import { bentHat, machinedAngle, tube } from '../../../reference/outlines'

/** A real thread: doubles numbers, spins for ever on `spin`, ends on `die`, throws on `throw`. */
const program = `
  const { parentPort } = require('node:worker_threads')
  parentPort.on('message', (task) => {
    if (task === 'spin') for (;;);
    if (task === 'die') process.exit(3)
    if (task === 'throw') throw new Error('thrown in the thread')
    parentPort.postMessage(2 * task)
  })`
type Task = number | 'spin' | 'die' | 'throw'

const pools: ThreadPool<Task, number>[] = []
let started = 0
function pool(threads: number, mostWaiting = 8, timeLimit = 20_000): ThreadPool<Task, number> {
  const made = new ThreadPool<Task, number>(() => {
    started += 1
    return new Worker(program, { eval: true, stderr: true })
  }, { threads, mostWaiting, timeLimit })
  pools.push(made)
  return made
}
afterEach(async () => {
  await Promise.all(pools.splice(0).map(one => one.close()))
  await closeOutlinePool()
  started = 0
})

describe('a pool of threads', () => {
  it('answers every task, on no more threads than allowed, and keeps them', async () => {
    const two = pool(2)
    const answers = await Promise.all([1, 2, 3, 4, 5, 6].map(task => two.run(task)))
    expect(answers).toEqual([2, 4, 6, 8, 10, 12].map(answer => ({ ok: true, answer })))
    expect(await two.run(7)).toEqual({ ok: true, answer: 14 })
    expect(started).toBe(2)
    expect(two.load()).toEqual({ running: 0, waiting: 0 })
  })

  it('refuses what neither runs nor may wait, at once and in words', async () => {
    const one = pool(1, 1)
    const [ac, waitingAc] = [new AbortController(), new AbortController()]
    const [running, waiting] = [one.run('spin', ac.signal), one.run(1, waitingAc.signal)]
    expect(one.load()).toEqual({ running: 1, waiting: 1 })
    expect(await one.run(2)).toEqual({ ok: false, code: 'busy', reason: expect.stringMatching(/try again/) })
    waitingAc.abort()
    expect(await waiting).toMatchObject({ ok: false, code: 'cancelled' })
    expect(one.load()).toEqual({ running: 1, waiting: 0 })
    ac.abort()
    expect(await running).toMatchObject({ ok: false, code: 'cancelled' })
  })

  it('gives up a task that runs too long, and goes on with the next on a new thread', async () => {
    const one = pool(1, 8, 300)
    const [spun, next] = await Promise.all([one.run('spin'), one.run(4)])
    expect(spun).toMatchObject({ ok: false, code: 'too-long', reason: expect.stringMatching(/given up/) })
    expect(next).toEqual({ ok: true, answer: 8 })
    expect(started).toBe(2)
  })

  it('frees the thread of a cancelled task for the next', async () => {
    const one = pool(1)
    const ac = new AbortController()
    const [spun, next] = [one.run('spin', ac.signal), one.run(5)]
    ac.abort()
    expect(await spun).toMatchObject({ code: 'cancelled' })
    expect(await next).toEqual({ ok: true, answer: 10 })
    expect(await one.run(1, AbortSignal.abort())).toMatchObject({ code: 'cancelled' })
  })

  it.each(['die', 'throw'] as const)('survives a thread that ends (%s)', async (task) => {
    const one = pool(1)
    expect(await one.run(task)).toMatchObject({ ok: false, code: 'broken' })
    expect(await one.run(6)).toEqual({ ok: true, answer: 12 })
  })

  it('answers everything when it is closed, and takes nothing more', async () => {
    const one = pool(1)
    const [running, waiting] = [one.run('spin'), one.run(1)]
    await one.close()
    expect(await Promise.all([running, waiting])).toMatchObject([{ code: 'cancelled' }, { code: 'cancelled' }])
    expect(await one.run(1)).toMatchObject({ code: 'cancelled' })
  })
})

describe('outlines on threads', () => {
  it('have the very solution of the engine, and refusals come through', async () => {
    const outlines = [machinedAngle(60, 15, 6), bentHat(40, 40, 20, 2, 3)]
    const answers = await Promise.all(outlines.map(outline => solveOutline({ outline })))
    expect(answers).toEqual(outlines.map(outline => outlineTorsion(outline)))
    expect(await solveOutline({ outline: tube(3, 3) })).toMatchObject({ ok: false, reason: expect.stringMatching(/meet/) })
  })

  it('are solved once: the same outline is answered from what is known, cancelled or not', async () => {
    const task = { outline: machinedAngle(40, 10, 4) }
    const first = await solveOutline(task)
    await closeOutlinePool()
    expect(await solveOutline(task, AbortSignal.abort())).toBe(first)
  })
})

describe('outlines of calculations', () => {
  it('are solved on threads before the calculations are evaluated; others are passed over', async () => {
    const inputs = thickAngleInputs()
    expect(await prepareOutlines([{ kind: 'general-outline', inputs }, { kind: 'open-section', inputs: {} }, { kind: 'general-outline', inputs: null }])).toBeNull()
    expect(evaluateGeneralOutline(inputs).ok).toBe(true)
    expect(await prepareOutlines([{ kind: 'general-outline', inputs: sharpBracketInputs() }], AbortSignal.abort())).toMatchObject({ ok: false, code: 'cancelled' })
  })
})
