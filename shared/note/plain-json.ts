/** Keys that reach an object's prototype when copied carelessly. */
const FORBIDDEN_KEYS = new Set(['__proto__', 'constructor', 'prototype'])

/** Control characters other than tab and line feed cannot be stored or printed; a lone surrogate has no UTF-8 form. */
const UNSTORABLE = /[^\P{Cc}\t\n]|[\p{Cs}\ufffe\uffff]/u

/** Whether the text can be stored, printed and hashed. */
export const isStorable = (text: string): boolean => !UNSTORABLE.test(text)

export const isRecord = (value: unknown): value is Record<string, unknown> => {
  if (typeof value !== 'object' || value === null || Array.isArray(value)) return false
  const prototype: unknown = Object.getPrototypeOf(value)
  return prototype === null || Object.getPrototypeOf(prototype) === null
}

export interface JsonLimits { depth: number, values: number, characters: number }

/**
 * Says why the value is not plain JSON within the limits, or null when it is.
 * Walks without recursion, so that depth cannot exhaust the stack.
 */
export function jsonFault(root: unknown, limits: JsonLimits): string | null {
  const open: { value: unknown, depth: number }[] = [{ value: root, depth: 1 }]
  let values = 0
  let characters = 0
  for (let item = open.pop(); item; item = open.pop()) {
    const { value, depth } = item
    if (++values > limits.values) return 'holds too many values'
    if (depth > limits.depth) return 'is nested too deeply'
    if (typeof value === 'string') {
      characters += value.length
      if (!isStorable(value)) return 'holds a character that cannot be stored'
    } else if (typeof value === 'number') {
      if (!Number.isFinite(value)) return 'holds a number that is not finite'
    } else if (Array.isArray(value)) {
      for (const child of value) open.push({ value: child, depth: depth + 1 })
    } else if (isRecord(value)) {
      for (const key of Object.keys(value)) {
        if (FORBIDDEN_KEYS.has(key)) return `holds the key ${key}`
        characters += key.length
        if (!isStorable(key)) return 'holds a character that cannot be stored'
        open.push({ value: value[key], depth: depth + 1 })
      }
    } else if (value !== null && typeof value !== 'boolean') return 'holds something that is not JSON'
    if (characters > limits.characters) return 'is too large'
  }
  return null
}
