/** Reference rows of the profiles: from the dimensions of a drawing to mid-line lengths and section properties (§1.9, §1.10, §3.2). */
import type { Engine } from './engine'
import type { ReferenceRow } from './row'
import type { Profile, ProfileSection } from '#shared/torsion/profiles/profile'
import { given } from './engine'
import { provenBy, rel, row } from './row'

const moduli = { G: 26_900, E: 71_000 }
const byHand = 'added up by hand from the drawing'
const closed = 'closed form (Vlasov; Timoshenko & Gere), verified numerically'
const thin = 'thin-wall theory, algebra'
const rolled = 'tables of European hot-rolled sections (EN 10365 sizes), warping constant as printed, from memory'

const of = (engine: Engine, profile: Profile): ProfileSection => given(engine.sectionOfProfile(profile, moduli))
const line = (engine: Engine, profile: Profile, what: string): number => {
  const found = of(engine, profile).lines.find(one => one.of === what)
  if (!found) throw new Error(`No line for the ${what}`)
  return found.value
}
const plainJ = (engine: Engine, profile: Profile): number => given(engine.torsionOfOpenSection(of(engine, profile).section)).plainGJ / moduli.G
const J = (engine: Engine, profile: Profile): number => given(engine.torsionOfOpenSection(of(engine, profile).section)).J ?? Number.NaN
const sectorial = (engine: Engine, profile: Profile) => given(engine.sectorialProperties(of(engine, profile).section))

const sharp = { make: 'machined', radius: 0 } as const
/** C-38 over its outside: flanges 40 + 3/2, web 100 + 4. */
const channel = { shape: 'channel', measured: 'outside', ...sharp, lower: 41.5, height: 104, upper: 41.5, tLower: 4, tWeb: 3, tUpper: 4 } as const
/** C-70 clear inside: flanges 35 − 2.5/2, web 80 − 3. */
const zed = { shape: 'zed', measured: 'inside', ...sharp, lower: 33.75, height: 77, upper: 33.75, tLower: 3, tWeb: 2.5, tUpper: 3 } as const
const unequalI = { shape: 'I', measured: 'outside', ...sharp, lower: 80, height: 155, upper: 50, tLower: 6, tWeb: 4, tUpper: 4 } as const
const angle = { shape: 'angle', measured: 'outside', make: 'machined', radius: 0.5, width: 10, height: 10, tWidth: 1, tHeight: 1 } as const
const bentAngle = { ...angle, make: 'bent' } as const
const tee = { shape: 'tee', measured: 'outside', make: 'machined', radius: 0.5, flange: 14, height: 10, tFlange: 1, tStem: 1 } as const
const hat = { shape: 'hat', measured: 'outside', make: 'bent', radius: 3, brim: 22, height: 42, crown: 42, lean: 0, tBrim: 2, tWeb: 2, tCrown: 2 } as const
const leaningHat = { ...hat, measured: 'inside', lean: Math.PI / 6, tBrim: 1, tWeb: 2, tCrown: 3, make: 'machined', radius: 0 } as const
const lipped = { shape: 'lipped channel', measured: 'outside', make: 'bent', radius: 5, lip: 17.25, flange: 42.5, height: 82.5, tLip: 2.5, tFlange: 2.5, tWeb: 2.5 } as const
const jProfile = { shape: 'J', measured: 'outside', ...sharp, base: 40, height: 50, cap: 15, tBase: 3, tWeb: 2, tCap: 4 } as const
const rolledI = (h: number, b: number, tw: number, tf: number): Profile => ({ shape: 'I', measured: 'outside', ...sharp, lower: b, height: h, upper: b, tLower: tf, tWeb: tw, tUpper: tf })

const lengths: ReferenceRow[] = [
  row('§1.9', 'mid-line web of a channel', 'outside 104, flanges 4', 100, 'mm', rel(1e-14), byHand, e => line(e, channel, 'web')),
  row('§1.9', 'mid-line flange of a channel', 'outside 41.5, web 3', 40, 'mm', rel(1e-14), byHand, e => line(e, channel, 'upper flange')),
  row('§1.9', 'mid-line web of a zed', 'clear 77, flanges 3', 80, 'mm', rel(1e-14), byHand, e => line(e, zed, 'web')),
  row('§1.9', 'mid-line stem of a tee', 'outside 10, flange 1', 9.5, 'mm', rel(1e-14), byHand, e => line(e, tee, 'stem')),
  row('§1.9', 'mid-line web of a J', 'outside 50, base 3, cap 4', 46.5, 'mm', rel(1e-14), byHand, e => line(e, jProfile, 'web')),
  row('§1.9', 'mid-line cap of a J', 'outside 15, web 2', 14, 'mm', rel(1e-14), byHand, e => line(e, jProfile, 'cap')),
  // θ = 60°: (2 − 3·½)/(2·√3/2) = 0.288675 at each end of the crown, (2 − 1·½)/√3 = 0.866025 at the brim, 40 + ½(1 + 3) = 44 upright, over cos 30°.
  row('§1.9', 'mid-line crown of a leaning hat', 'clear 42, lean 30°, t 1, 2, 3', 42.57735026918963, 'mm', rel(1e-14), byHand, e => line(e, leaningHat, 'crown')),
  row('§1.9', 'mid-line brim of a leaning hat', 'clear 22, lean 30°, t 1, 2, 3', 22.866025403784437, 'mm', rel(1e-14), byHand, e => line(e, leaningHat, 'brim')),
  row('§1.9', 'mid-line web of a leaning hat', 'clear height 42, lean 30°, t 1, 2, 3', 44 / Math.cos(Math.PI / 6), 'mm', rel(1e-14), byHand, e => line(e, leaningHat, 'web')),
  // Mid-line legs 9.5; one bend at r_m = 1: 2·9.5 − 2·1 + π/2.
  row('§1.10', 'developed length of a bent angle', 'legs 10 outside, t 1, r_i 0.5', 17 + Math.PI / 2, 'mm', rel(1e-14), byHand, e => line(e, bentAngle, 'developed length of the mid-line')),
  // 21 + 40 + 40 + 40 + 21, four bends at r_m = 4.
  row('§1.10', 'developed length of a bent hat', 'outside 42 × 42, brims 22, t 2, r_i 3', 162 - 8 * 4 + 4 * 4 * Math.PI / 2, 'mm', rel(1e-14), byHand, e => line(e, hat, 'developed length of the mid-line')),
  row('§1.10', 'tangent length of a bend', 'r_i 3, t 2, 90°', 4, 'mm', rel(1e-14), byHand, e => line(e, hat, 'tangent length of the bend at 2')),
  row('§1.10', 'length of a bend along the mid-line', 'r_i 3, t 2, 90°', 2 * Math.PI, 'mm', rel(1e-14), byHand, e => line(e, hat, 'length of the bend at 2')),
  row('§1.10', 'developed length that stiffness is computed with', 'outside 42 × 42, brims 22, t 2, r_i 3', 162 - 8 * 4 + 4 * 4 * Math.PI / 2, 'mm', rel(1e-12), byHand, e => given(e.torsionOfOpenSection(of(e, hat).section)).developed),
  row('§1.9', 'mid-line radius of a slit tube', 'outside diameter 102, t 2', 50, 'mm', rel(1e-14), byHand, e => line(e, { shape: 'slit tube', measured: 'outside', diameter: 102, t: 2 }, 'radius of the mid-line')),
  row('§1.9', 'mid-line radius of an arc', 'inside radius 39.25, t 1.5', 40, 'mm', rel(1e-14), byHand, e => line(e, { shape: 'arc', measured: 'inside', radius: 39.25, angle: 2, t: 1.5 }, 'radius of the mid-line')),
]

const tube = { shape: 'slit tube', measured: 'inside', diameter: 98, t: 2 } as const
const arc = { shape: 'arc', measured: 'outside', radius: 40.75, angle: 2 * Math.PI / 3, t: 1.5 } as const
const properties: ReferenceRow[] = [
  row('C-38', 'channel J, centre-line, from its outside', 'outside 104 × 41.5, t 4, 3', 2606.66666666667, 'mm⁴', rel(1e-12), thin, e => plainJ(e, channel)),
  row('C-44', 'machined angle J from its outside', 'legs 10, t 1, fillet 0.5', 6.34623047007496, 'mm⁴', rel(1e-9), 'El Darwish & Johnston 1965, coefficients from memory; boundary elements agree to 0.3 %', e => J(e, angle)),
  row('C-46', 'machined tee J from its outside', 'flange 14×1, stem to 10 overall ×1, fillets 0.5', 8.01181666666667, 'mm⁴', rel(1e-9), 'El Darwish & Johnston 1965, coefficients from memory; boundary elements agree to 0.3 %', e => J(e, tee)),
  row('§1.10', 'slit tube J from its inside', 'inside diameter 98, t 2', 837.758040957278, 'mm⁴', rel(1e-12), '2πR t³/3', e => plainJ(e, tube)),
  row('C-64', 'channel shear centre from the web, from its outside', 'outside 104 × 41.5, t 4, 3', 15.2380952380952, 'mm', rel(1e-12), closed, e => -sectorial(e, channel).shearCentre.x),
  row('C-65', 'channel Γ from its outside', 'outside 104 × 41.5, t 4, 3', 182_857_142.857143, 'mm⁶', rel(1e-10), closed, e => sectorial(e, channel).gamma),
  row('C-68', 'unequal I-section Γ from its outside', 'outside height 155, flanges 80×6 and 50×4, web 4', 806_270_996.640538, 'mm⁶', rel(1e-10), closed, e => sectorial(e, unequalI).gamma),
  row('C-69', 'unequal I-section shear centre from its outside', 'as C-68', 20.996640537514, 'mm', rel(1e-10), closed, e => sectorial(e, unequalI).shearCentre.y),
  row('C-70', 'Z-section Γ from its inside', 'clear 77 × 33.75, t 3, 2.5', 84_495_121.9512195, 'mm⁶', rel(1e-10), closed, e => sectorial(e, zed).gamma),
  row('C-71', 'slit tube shear centre from its inside', 'inside diameter 98, t 2', 100, 'mm', rel(1e-12), closed, e => -sectorial(e, tube).shearCentre.x),
  row('C-72', 'slit tube Γ from its inside', 'inside diameter 98, t 2', 5_065_300_316.15044, 'mm⁶', rel(1e-10), closed, e => sectorial(e, tube).gamma),
  row('§3.2', 'arc Γ from its outside', 'outside radius 40.75, 120°, t 1.5', 297_104.4626176179, 'mm⁶', rel(1e-10), closed, e => sectorial(e, arc).gamma),
  ...([[200, 100, 5.6, 8.5, 12.99], [300, 150, 7.1, 10.7, 125.9], [190, 200, 6.5, 10, 108], [200, 200, 9, 15, 171.1]] as const).map(([h, b, tw, tf, table]) =>
    row('§3.2', 'warping constant of a rolled section', `h ${h}, b ${b}, tw ${tw}, tf ${tf} mm`, table * 1e9, 'mm⁶', rel(6e-4), rolled, e => sectorial(e, rolledI(h, b, tw, tf)).gamma)),
  row('§1.9', 'area of a lipped channel on its mid-line', 'outside 82.5 × 42.5, lips 17.25, t 2.5, r_i 5', 2.5 * (2 * 16 + 2 * 40 + 80 - 8 * 6.25 + 4 * 6.25 * Math.PI / 2), 'mm²', rel(1e-12), byHand, e => sectorial(e, lipped).A),
]

export const profileRows: readonly ReferenceRow[] = [...provenBy('1.9', lengths), ...properties]
