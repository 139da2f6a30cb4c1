/** Judges every reference case off the event loop and says each as it is done. */
import { parentPort } from 'node:worker_threads'
import { loadEngine } from '#reference/engine'
import { referenceRows } from '#reference/rows'
import { judgeRow } from './judge-row'

const engine = await loadEngine()
for (const row of referenceRows) parentPort?.postMessage(judgeRow(row, engine))
