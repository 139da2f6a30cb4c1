/**
 * Statical moments along a graph of walls: what has been gathered from the free edges at the start of each
 * wall, in its own sense. Walls that close cells are cut at their start.
 */
export interface Edge { readonly from: string, readonly to: string }

interface Tree { readonly order: readonly { readonly edge: number, readonly parent: string, readonly child: string }[], readonly chords: readonly number[] }

/** A spanning tree, each edge after the one that leads to it, and the edges left over. */
function spanningTree(edges: readonly Edge[]): Tree {
  const at = new Map<string, number[]>()
  edges.forEach(({ from, to }, i) => [from, to].forEach((node) => {
    const list = at.get(node)
    if (list) list.push(i)
    else at.set(node, [i])
  }))
  const root = edges[0]?.from ?? ''
  const reached = new Set([root])
  const order: { edge: number, parent: string, child: string }[] = []
  const used = new Set<number>()
  const queue = [root]
  for (let head = 0; head < queue.length; head += 1) {
    const parent = queue[head] ?? ''
    for (const i of at.get(parent) ?? []) {
      const edge = edges[i]
      const child = edge?.from === parent ? edge.to : edge?.from ?? ''
      if (used.has(i) || reached.has(child)) continue
      used.add(i)
      reached.add(child)
      order.push({ edge: i, parent, child })
      queue.push(child)
    }
  }
  return { order, chords: edges.flatMap((_, i) => (used.has(i) ? [] : [i])) }
}

/** @param totals what each wall adds from its start to its end  @returns what is gathered at the start of each */
export function gatherFromFreeEdges(edges: readonly Edge[], totals: readonly number[]): number[] {
  const { order, chords } = spanningTree(edges)
  const hanging = new Map<string, number>()
  const hang = (node: string, value: number) => hanging.set(node, (hanging.get(node) ?? 0) + value)
  const start = edges.map(() => 0)
  for (const i of chords) hang(edges[i]?.to ?? '', totals[i] ?? 0)
  for (const { edge: i, parent, child } of [...order].reverse()) {
    const [beyond, own] = [hanging.get(child) ?? 0, totals[i] ?? 0]
    hang(parent, beyond + own)
    // Towards the root the gathered moment is what lies beyond; away from it, minus all that is still to come.
    start[i] = edges[i]?.to === parent ? beyond : -(beyond + own)
  }
  return start
}
