/**
 * A profile as the drawing gives it becomes an open section on its mid-line,
 * with every step of the conversion (methods reference §1.9, §1.10). Bends keep
 * their length along the mid-line: two straight parts and the bend between.
 */
import type { Refusal } from '#shared/torsion/section'
import type { ConversionLine, Moduli, Profile, ProfileSection } from '#shared/torsion/profiles/profile'
import type { Converted } from '#shared/torsion/profiles/chains'
import { refusal } from '#shared/torsion/section'
import { finiteOrRefused } from '#shared/torsion/finite'
import { checkSection } from '#shared/torsion/section-check'
import { angleWalls, channelWalls, hatWalls, lippedChannelWalls } from '#shared/torsion/profiles/chains'
import { iWalls, jWalls, teeWalls } from '#shared/torsion/profiles/branched'
import { arcWall, slitTubeWall } from '#shared/torsion/profiles/round-walls'
import { bendTangent, radiiFit } from '#shared/torsion/profiles/radii-fit'
import { conversion } from '#shared/torsion/profiles/conversion'
import { turnsAtBends } from '#shared/torsion/profiles/bend-turns'

/** Names of the dimensions for sentences. */
const called: Readonly<Record<string, string>> = {
  width: 'width', height: 'height', flange: 'width of the flange', lower: 'width of the lower flange', upper: 'width of the upper flange', brim: 'width of the brim', crown: 'width of the crown',
  lip: 'depth of the lip', base: 'width of the base', cap: 'width of the cap', angle: 'swept angle', diameter: 'diameter', radius: 'radius', t: 'thickness',
}
const mayBeZero = (profile: Profile, key: string): boolean => key === 'lean' || (key === 'radius' && profile.shape !== 'arc')
const thickness = (key: string): boolean => /^t[A-Z]/.test(key)

function numbersFault(profile: Profile): string | null {
  for (const [key, value] of Object.entries(profile) as [string, unknown][]) {
    if (typeof value !== 'number') continue
    const name = called[key] ?? (thickness(key) ? `thickness of the ${key.slice(1).toLowerCase()}` : key)
    if (!Number.isFinite(value) || value < 0 || (value === 0 && !mayBeZero(profile, key))) return `The ${name} of the ${profile.shape} must be a number greater than zero${mayBeZero(profile, key) ? ', or zero' : ''}.`
  }
  return null
}

/** One sheet has one thickness, and a bend joins two walls. */
function bentFault(profile: Profile): string | null {
  if (!('make' in profile) || profile.make !== 'bent') return null
  if (profile.shape === 'tee' || profile.shape === 'I' || profile.shape === 'J') return `Three walls of the ${profile.shape} meet, which no bend joins. Give its corners as machined.`
  const walls = (Object.entries(profile) as [string, unknown][]).filter(([key]) => thickness(key)).map(([, t]) => t)
  return walls.every(t => t === walls[0]) ? null : 'A bent profile is one sheet: give all its walls one thickness, or give its corners as machined.'
}

function convert(profile: Profile, moduli: Moduli): Converted {
  switch (profile.shape) {
    case 'angle': return angleWalls(profile, moduli)
    case 'tee': return teeWalls(profile, moduli)
    case 'channel': case 'zed': return channelWalls(profile, moduli)
    case 'hat': return hatWalls(profile, moduli)
    case 'lipped channel': return lippedChannelWalls(profile, moduli)
    case 'I': return iWalls(profile, moduli)
    case 'J': return jWalls(profile, moduli)
    case 'arc': return arcWall(profile, moduli)
    case 'slit tube': return slitTubeWall(profile, moduli)
  }
}

/** The sheet before bending: mid-line walls, less two tangent lengths and plus one arc for every bend. */
function developedLine({ section }: Pick<ProfileSection, 'section'>): ConversionLine[] {
  const bends = turnsAtBends(section)
  if (bends.length === 0) return []
  const lengths = section.walls.map(({ id, from, to }) => {
    const [a, b] = [from, to].map(node => section.nodes.find(one => one.id === node))
    return { symbol: `L_{${id}}`, factor: 1, value: a && b ? Math.hypot(b.x - a.x, b.y - a.y) : 0 }
  })
  const sharp = bends.map(({ node, radius, t, turn }) => ({ symbol: `s_{${node}}`, factor: -2, value: bendTangent(radius, t, turn) }))
  const arcs = bends.map(({ node, radius, t, turn }) => ({ symbol: `a_{${node}}`, factor: 1, value: (radius + t / 2) * turn }))
  return [
    ...bends.flatMap(({ node }, i) => [
      conversion(`tangent length of the bend at ${node}`, `s_{${node}}`, [{ symbol: '(r + t/2)\\tan(\\varphi/2)', factor: 1, value: sharp[i]?.value ?? 0 }]),
      conversion(`length of the bend at ${node}`, `a_{${node}}`, [{ symbol: '(r + t/2)\\varphi', factor: 1, value: arcs[i]?.value ?? 0 }]),
    ]),
    conversion('developed length of the mid-line', 'L', [...lengths, ...sharp, ...arcs]),
  ]
}

/**
 * The open section of a profile. Refused, with what to do, where a dimension is
 * no length, a radius does not fit on a wall, walls of differing thickness are
 * to be bent from one sheet, or the walls meet where they should not.
 */
export function sectionOfProfile(profile: Profile, moduli: Moduli): ProfileSection | Refusal {
  const fault = numbersFault(profile)
  if (fault) return refusal(fault)
  const bent = bentFault(profile)
  if (bent) return refusal(bent, 'make')
  const converted = convert(profile, moduli)
  if ('ok' in converted) return converted
  const { section, names } = converted.drawn
  const tight = radiiFit(section, names)
  if (tight) return tight
  const check = checkSection(section)
  if (!check.ok) return refusal(check.reason)
  return finiteOrRefused<ProfileSection>({ ok: true, section, names, lines: [...converted.lines, ...developedLine({ section })] })
}
