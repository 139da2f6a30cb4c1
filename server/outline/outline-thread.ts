/** Solves outlines off the event loop, one at a time. */
import { parentPort } from 'node:worker_threads'
import { outlineTorsion } from '#shared/torsion/outline/outline-torsion'
import type { OutlineTask } from './solve-outline'

parentPort?.on('message', ({ outline, options }: OutlineTask) => parentPort?.postMessage(outlineTorsion(outline, options)))
