/** The verdict on one quantity. */
import { relation } from '#shared/note/loose/context'
import type { Context } from '#shared/note/loose/context'
import type { Fact, FactIndex } from '#shared/note/loose/facts'
import { factsBetween, factsIn } from '#shared/note/loose/facts'
import { agrees, engineRange } from '#shared/note/loose/precision'
import type { Quantity } from '#shared/note/loose/quantities'
import type { Slip } from '#shared/note/loose/slips'
import { NEEDED_DIGITS, slipsOf } from '#shared/note/loose/slips'
import type { LooseCandidate, LooseVerdict } from '#shared/note/loose-numbers'
import { fromEngine, unitFits, unitsOf } from '#shared/units/units'
import type { UnitId } from '#shared/units/units'

export interface Judgement { verdict: LooseVerdict, candidates: LooseCandidate[], reason: string }

const MOST_CANDIDATES = 5
/** The same value under several keys, or computed twice along one way. */
const SAME = 1e-9

const candidate = ({ calcId, key, label, shown, tieable }: Fact): LooseCandidate => ({ calcId, key, label, shown, tieable })
const named = (fact: Fact) => `${fact.label} (${fact.shown})`

const sameValue = (a: Fact, b: Fact) =>
  a.calcId === b.calcId && a.dimension === b.dimension && Math.abs(a.value - b.value) <= SAME * Math.max(Math.abs(a.value), Math.abs(b.value))

/** Facts of one calculation with one value, which a text cannot tell apart. */
function grouped(facts: readonly Fact[]): Fact[][] {
  const groups: Fact[][] = []
  for (const fact of facts) {
    const group = groups.find(([first]) => first !== undefined && sameValue(first, fact))
    if (group) group.push(fact)
    else groups.push([fact])
  }
  return groups
}

/** Units in which a bare number may be meant: that of the result first. */
const unitsFor = (fact: Fact): UnitId[] => [fact.unit, ...unitsOf(fact.dimension).filter(unit => unit !== fact.unit)]

const states = ({ token, unit }: Quantity, fact: Fact): boolean =>
  unit !== null ? agrees(token, fact, unit) : unitsFor(fact).some(own => agrees(token, fact, own))

function matching(quantity: Quantity, index: FactIndex): Fact[] {
  const { token, unit, beside } = quantity
  if (beside.length > 0) return beside.filter(fact => states(quantity, fact))
  if (unit === null) return []
  const [low, high] = engineRange(token, unit)
  return factsIn(unit, index).flatMap(sorted => factsBetween(sorted, low, high))
    .filter(fact => !fact.truncated && agrees(token, fact, unit))
}

type Bond = 'caseId' | 'wall'

/** Of a group with one value, those bound to a case (or wall) say where the value comes from; the others only repeat it. */
const bound = (group: readonly Fact[], bond: Bond): Fact[] => group.some(fact => fact[bond] !== null) ? group.filter(fact => fact[bond] !== null) : [...group]

const kin = (a: Fact, b: Fact, bond: Bond) =>
  a.calcId === b.calcId && a.dimension === b.dimension && a.tieable === b.tieable
  && (bond === 'caseId' ? a.key.split('@')[0] === b.key.split('@')[0] : a.caseId === b.caseId && a.key.split(':')[0] === b.key.split(':')[0])

/** Groups that fit the cases (or walls) named beside the number. Where none does, the result that was meant, if the note has it. */
function fitting(groups: Fact[][], said: Set<string>, bond: Bond, index: FactIndex): { groups: Fact[][], meant: Fact | null } {
  if (said.size === 0) return { groups, meant: null }
  const kept = groups.map(group => bound(group, bond).filter(fact => fact[bond] === null || said.has(fact[bond]))).filter(group => group.length > 0)
  if (kept.length > 0) return { groups: kept, meant: null }
  const strays = groups.flatMap(group => bound(group, bond))
  const meant = index.all.find(fact => fact[bond] !== null && said.has(fact[bond]) && strays.some(stray => kin(stray, fact, bond)))
  return { groups: meant ? [] : groups, meant: meant ?? null }
}

/** The fact that best stands for its group in this sentence. */
function best(group: readonly Fact[], quantity: Quantity, context: Context): Fact {
  const rank = (fact: Fact) => (quantity.beside.includes(fact) ? 8 : 0) + relation(fact, context) * 2
    + (fact.unit === quantity.unit ? 1 : 0) + (fact.tieable ? 16 : 0) + (fact.caseId !== null && context.cases.has(fact.caseId) ? 4 : 0)
  return group.reduce((top, fact) => rank(fact) > rank(top) ? fact : top)
}

function agreement(groups: Fact[][], quantity: Quantity, context: Context): Judgement {
  const strength = (group: readonly Fact[]) => Math.max(...group.map(fact => relation(fact, context) + (fact.tieable ? 0.5 : 0)))
  const top = Math.max(...groups.map(strength))
  const closest = groups.filter(group => strength(group) === top)
  const facts = closest.map(group => best(group, quantity, context))
  const [only] = facts
  if (facts.length === 1 && only) {
    return { verdict: 'agreeing', candidates: [candidate(only)], reason: `It agrees with ${named(only)} but is not tied to it.` }
  }
  return {
    verdict: 'ambiguous', candidates: facts.slice(0, MOST_CANDIDATES).map(candidate),
    reason: `It agrees with ${facts.length} results. Choose the one that is meant.`,
  }
}

const differing = (facts: Fact[], reason: string): Judgement =>
  ({ verdict: 'disagreeing', candidates: [...new Set(facts)].slice(0, 3).map(candidate), reason })

function stray(groups: Fact[][], meant: Fact, bond: Bond, quantity: Quantity, context: Context): Judgement {
  const of = best(bound(groups[0] ?? [meant], bond), quantity, context)
  const whose = bond === 'caseId' ? `case ${of.caseId ?? ''}` : `wall ${of.wall ?? ''}`
  return differing([meant, of], `This is the value of ${whose}; the text speaks of ${bond === 'caseId' ? 'case' : 'wall'} ${meant[bond] ?? ''}, where ${named(meant)} holds.`)
}

/** Beside a symbol, the result of that symbol that was most likely meant. */
function nearestOf(quantity: Quantity, context: Context): Fact | null {
  const { token, beside } = quantity
  const inCase = beside.filter(fact => fact.caseId !== null && context.cases.has(fact.caseId))
  const pool = inCase.length > 0 ? inCase : beside
  const unit = quantity.unit
  const distance = (fact: Fact) => Math.abs(Math.log(Math.abs((unit !== null && unitFits(unit, fact.dimension) ? fromEngine(fact.value, unit) : fact.own) || 1e-30) / (Math.abs(token.value) || 1e-30)))
  return pool.reduce<Fact | null>((top, fact) => top === null || distance(fact) < distance(top) ? fact : top, null)
}

function besideVerdict(quantity: Quantity, slips: Slip[], context: Context): Judgement | null {
  const { unit, beside } = quantity
  const slip = believed(slips.filter(({ fact }) => beside.includes(fact)), quantity, context)[0]
  if (slip) return differing([slip.fact], `It differs from ${named(slip.fact)}: ${slip.how}.`)
  // The symbol means something else here when the unit cannot be its own: T for a temperature.
  if (unit !== null && !beside.some(fact => unitFits(unit, fact.dimension))) return null
  const nearest = nearestOf(quantity, context)
  return nearest && differing([nearest], `It stands beside ${nearest.symbol} and differs from ${named(nearest)}.`)
}

/** Slips for which the words around and the digits typed speak strongly enough, the best first. */
function believed(slips: Slip[], quantity: Quantity, context: Context): Slip[] {
  const standing = ({ fact }: Slip) => quantity.beside.includes(fact) ? 3 : relation(fact, context)
  const needed = (slip: Slip) => {
    const level = standing(slip)
    return level === 3 ? 2 : NEEDED_DIGITS[slip.kind][level]
  }
  const case_ = ({ fact }: Slip) => fact.caseId !== null && context.cases.has(fact.caseId) ? 1 : 0
  if (slips.length === 0) return []
  return slips
    .filter(slip => quantity.token.digits.length - Math.min(quantity.token.trailingZeros, quantity.token.digits.length - 2) >= needed(slip)
      && (context.cases.size === 0 || slip.fact.caseId === null || case_(slip) === 1))
    .map((slip, order) => ({ slip, order }))
    .sort((a, b) => standing(b.slip) - standing(a.slip) || case_(b.slip) - case_(a.slip) || Number(b.slip.fact.tieable) - Number(a.slip.fact.tieable) || a.order - b.order)
    .map(({ slip }) => slip)
}

/** Compares one quantity with the results of the note. */
export function judge(quantity: Quantity, context: Context, index: FactIndex): Judgement {
  const matches = grouped(matching(quantity, index))
  if (matches.length > 0) {
    const byCase = fitting(matches, context.cases, 'caseId', index)
    if (byCase.meant) return stray(matches, byCase.meant, 'caseId', quantity, context)
    const byWall = fitting(byCase.groups, context.walls, 'wall', index)
    if (byWall.meant) return stray(byCase.groups, byWall.meant, 'wall', quantity, context)
    if (byWall.groups.length > 0) return agreement(byWall.groups, quantity, context)
  }
  const unrelated: Judgement = { verdict: 'unrelated', candidates: [], reason: 'No result of the note is near it. Explain where it comes from.' }
  if (quantity.foreign) return unrelated
  const units = quantity.unit !== null ? [quantity.unit] : [...new Set(quantity.beside.map(fact => fact.unit))]
  const slips = units.flatMap(unit => slipsOf(quantity.token, unit, index))
  if (quantity.beside.length > 0) return besideVerdict(quantity, slips, context) ?? unrelated
  const likely = believed(slips, quantity, context)
  const [first] = likely
  return first ? differing(likely.slice(0, 3).map(({ fact }) => fact), `It is near ${named(first.fact)} but differs: ${first.how}.`) : unrelated
}
