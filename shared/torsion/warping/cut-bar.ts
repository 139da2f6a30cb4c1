/** Members and nodes of a bar from its lengths of one section each and from the places where something stands or begins. mm. */
import { refusal, type Refusal } from '#shared/torsion/section'

export interface Length { readonly length: number, readonly GJ: number, readonly EG: number }
export interface CutBar {
  readonly ok: true
  readonly members: readonly Length[]
  /** Which length each member is of. */
  readonly lengthOf: readonly number[]
  /** From the start of the bar; one more than members. */
  readonly nodes: readonly number[]
  /** The node at a place that was given. */
  readonly nodeAt: (z: number) => number
}

/** Places nearer than this, over the length of the bar, are one. */
const SAME = 1e-9

/** One member between any two neighbouring places; ends and changes of section are places anyway. */
export function cutBar(lengths: readonly Length[], places: readonly number[]): CutBar | Refusal {
  const fault = lengths.findIndex(({ length }) => !(Number.isFinite(length) && length > 0))
  if (lengths.length === 0) return refusal('The bar has no length. Add the first part of it.')
  if (fault >= 0) return refusal(`Part ${fault + 1} of the bar needs a length greater than zero.`)
  const bare = lengths.findIndex(({ GJ, EG }) => !(Number.isFinite(GJ) && GJ > 0 && Number.isFinite(EG) && EG >= 0))
  if (bare >= 0) return refusal(`Part ${bare + 1} of the bar needs a GJ greater than zero and an EΓ of zero or more.`)
  const changes = lengths.reduce<number[]>((at, { length }) => [...at, (at.at(-1) ?? 0) + length], [0])
  const total = changes.at(-1) ?? 0
  const off = places.find(z => !(z >= -SAME * total && z <= total * (1 + SAME)))
  if (off !== undefined) return refusal(`A place lies at ${off} mm, beyond the bar, which is ${total} mm long.`)
  const nodes: number[] = [...changes]
  for (const z of [...places].sort((a, b) => a - b)) if (!nodes.some(node => Math.abs(node - z) <= SAME * total)) nodes.push(z)
  nodes.sort((a, b) => a - b)
  const lengthOf = nodes.slice(1).map((end, i) => Math.max(0, changes.findLastIndex(start => start <= ((nodes[i] ?? 0) + end) / 2)))
  return {
    ok: true, nodes, lengthOf, members: lengthOf.map((of, i) => ({ length: (nodes[i + 1] ?? 0) - (nodes[i] ?? 0), GJ: lengths[of]?.GJ ?? 0, EG: lengths[of]?.EG ?? 0 })),
    nodeAt: z => nodes.reduce((best, node, i) => (Math.abs(node - z) < Math.abs((nodes[best] ?? 0) - z) ? i : best), 0),
  }
}
