import { onScopeDispose, shallowRef } from 'vue'

/** Part of a frame that a question may take before the page is let breathe. */
const SLICE = 8

/** Runs a question that yields between its steps, a slice per frame; a newer question or the end of the component stops it. */
export function useAsking() {
  const asking = shallowRef(false)
  let current: Generator<undefined, unknown> | null = null

  function ask<T>(question: Generator<undefined, T>, done: (answer: T) => void) {
    current = question
    asking.value = true
    const slice = () => {
      if (current !== question) return
      const until = performance.now() + SLICE
      while (performance.now() < until) {
        const step = question.next()
        if (!step.done) continue
        current = null
        asking.value = false
        done(step.value)
        return
      }
      requestAnimationFrame(slice)
    }
    requestAnimationFrame(slice)
  }
  function stop() {
    current = null
    asking.value = false
  }
  onScopeDispose(stop)
  return { asking, ask, stop }
}
