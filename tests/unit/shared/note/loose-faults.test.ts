import { describe, expect, it } from 'vitest'
import { scanLooseNumbers } from '#shared/note/loose-numbers'
import { readDocument } from '#shared/note/schema'
import { noteDocument, paragraph } from '../../../factories/note-document'
import { calculations, RESULTS } from './sample-results'

/**
 * Sixty sentences with one planted fault each. The number is the last column but one as it is found,
 * the last the result that must be named. Each was made from the value in `sample-results` by hand.
 */
const FAULTS: [sort: string, sentence: string, found: string, key: string][] = [
  // One wrong digit.
  ['wrong digit', 'The torsion constant of the channel is J = 3884.2 mm⁴ after the end terms.', '3884.2 mm⁴', 'J'],
  ['wrong digit', 'In case L04 the rate of twist is 27.78 °/m.', '27.78 °/m', 'theta_deg@L04'],
  ['wrong digit', 'The largest face stress in L07 is 66.7 MPa and governs.', '66.7 MPa', 'tau_max@L07'],
  ['wrong digit', 'With MS = +0.98 in L07 the carrier is adequate.', '+0.98', 'MS:shear-ultimate@L07'],
  ['wrong digit', 'The warping constant is 2.7836×10⁶ mm⁶ about the shear centre.', '2.7836×10⁶ mm⁶', 'Gamma'],
  ['wrong digit', 'At kL = 5.774 the root effect has died out before mid-span.', '5.774', 'kL'],
  ['wrong digit', 'The shear centre, y, lies at 36.447 mm from the brims.', '36.447 mm', 'y_S'],
  ['wrong digit', 'Case L09 brings a torque of 27 340 N·mm to the free end.', '27 340 N·mm', 'T@L09'],
  ['wrong digit', 'The torsional stiffness GJ is 101.74 N·m² for the whole bar.', '101.74 N·m²', 'GJ'],
  ['wrong digit', 'In B02 the clip carries a peak shear stress of 7.667 ksi.', '7.667 ksi', 'tau_max@B02'],
  // Digits that changed places.
  ['transposed', 'The torsion constant J is 3846.2 mm⁴.', '3846.2 mm⁴', 'J'],
  ['transposed', 'The torque in L07 is 64 350 N·mm at limit.', '64 350 N·mm', 'T@L07'],
  ['transposed', 'The end of the carrier turns through 15.81° over its length in L07, which is 0.2362 rad.', '0.2362 rad', 'twist@L07'],
  ['transposed', 'The developed mid-line length is 134.87 mm.', '134.87 mm', 'developed'],
  ['transposed', 'The largest sectorial coordinate is 352.66 mm², at the brim tip.', '352.66 mm²', 'omega_max'],
  ['transposed', 'In B02 the torque on the clip is 421.6 lbf·in.', '421.6 lbf·in', 'T@B02'],
  // The right digits with the wrong unit.
  ['wrong unit', 'J = 3864.2 cm⁴ is used in all cases.', '3864.2 cm⁴', 'J'],
  ['wrong unit', 'The torsion constant is 3864.2 mm², end terms included.', '3864.2 mm²', 'J'],
  ['wrong unit', 'Case L04 applies a torque of 48.2 N·mm at the hinge.', '48.2 N·mm', 'T@L04'],
  ['wrong unit', 'The largest face stress is 49.9 ksi in L04.', '49.9 ksi', 'tau_max@L04'],
  ['wrong unit', 'With G = 26.2 MPa the stiffness follows.', '26.2 MPa', 'G:QM-107'],
  ['wrong unit', 'The clip sees a torque of 412.6 lbf·ft in B02.', '412.6 lbf·ft', 'T@B02'],
  ['wrong unit', 'Γ = 2.7536×10⁶ mm⁴ includes the secondary part.', '2.7536×10⁶ mm⁴', 'Gamma'],
  ['wrong unit', 'The developed mid-line length, 143.87 in, is that of the blank.', '143.87 in', 'developed'],
  ['wrong unit', 'The torsional stiffness GJ is 101.24 N·mm².', '101.24 N·mm²', 'GJ'],
  ['wrong unit', 'The peak shear stress of the clip in B02 is 7.967 psi.', '7.967 psi', 'tau_max@B02'],
  // The right value of the wrong case, or wall.
  ['wrong case', 'In case L04 the peak shear stress is 65.7 MPa.', '65.7 MPa', 'tau_max@L04'],
  ['wrong case', 'The torque of case L07 is 48 200 N·mm.', '48 200 N·mm', 'T@L07'],
  ['wrong case', 'For L09 the rate of twist is 0.476 rad/m.', '0.476 rad/m', 'theta@L09'],
  ['wrong case', 'The margin in L07 is +1.48.', '+1.48', 'MS:shear-ultimate@L07'],
  ['wrong case', 'L04 turns the free end by 15.08°.', '15.08°', 'twist_deg@L04'],
  ['wrong case', 'Under L07 the twist over the length is 0.200 rad.', '0.200 rad', 'twist@L07'],
  ['wrong case', 'The carrier twists at 35.9 °/m in L04.', '35.9 °/m', 'theta_deg@L04'],
  ['wrong case', 'A margin of +3.28 in L04 closes the shear check.', '+3.28', 'MS:shear-ultimate@L04'],
  ['wrong wall', 'In L07 the face stress of wall a reaches 65.68 MPa.', '65.68 MPa', 'tau:a@L07'],
  ['wrong wall', 'Wall b is stressed to 39.9 MPa in L04.', '39.9 MPa', 'tau:b@L04'],
  // Degrees for radians.
  ['degrees for radians', 'The rate of twist in L04 is 27.28 rad/m.', '27.28 rad/m', 'theta_deg@L04'],
  ['degrees for radians', 'In L07 the rate of twist is 0.627 °/m.', '0.627 °/m', 'theta@L07'],
  ['degrees for radians', 'The twist over the length is φ = 15.08 rad in L07.', '15.08 rad', 'twist_deg@L07'],
  ['degrees for radians', 'The free end turns by an angle of 0.1159° in L09.', '0.1159°', 'twist@L09'],
  ['degrees for radians', 'θ′ = 35.91 rad/m is the highest of all cases, in L07.', '35.91 rad/m', 'theta_deg@L07'],
  ['degrees for radians', 'For B02 the rate of twist is 0.4709 rad/in.', '0.4709 rad/in', 'theta@B02'],
  ['degrees for radians', 'The rate of twist, 0.2760 °/m in L09, is the least of the three.', '0.2760 °/m', 'theta@L09'],
  // A factor applied twice, forgotten, or put where it does not belong.
  ['factor', 'At limit the peak shear stress in L07 is 98.5 MPa.', '98.5 MPa', 'tau_max@L07'],
  ['factor', 'The torque in L04 is T = 72 300 N·mm at limit.', '72 300 N·mm', 'T@L04'],
  ['factor', 'With the fitting factor the limit torque of L09 becomes 32 131 N·mm.', '32 131 N·mm', 'T@L09'],
  ['factor', 'The largest face stress at ultimate in L04 is 112.3 MPa.', '112.3 MPa', 'tau_max@L04'],
  ['factor', 'Each half of the pair takes a torque of 31 725 N·mm in L07.', '31 725 N·mm', 'T@L07'],
  ['factor', 'The rate of twist in L09 is θ′ = 0.414 rad/m.', '0.414 rad/m', 'theta@L09'],
  ['factor', 'In B02 the torque is 618.9 lbf·in.', '618.9 lbf·in', 'T@B02'],
  // Carried wrongly from one line to the next.
  ['carried', 'The torque of L07 is 63 450 N·mm; with T = 63 540 N·mm the rate of twist follows.', '63 540 N·mm', 'T@L07'],
  ['carried', 'From J = 3864.2 mm⁴ and T the rate of twist is found; the stress then takes J = 3907.6 mm⁴.', '3907.6 mm⁴', 'J'],
  ['carried', 'θ′ = T/(GJ) = 0.6267 rad/m in L07, so that with θ′ = 0.6767 rad/m the wall sees its peak.', '0.6767 rad/m', 'theta@L07'],
  ['carried', 'In L04 the stress follows as τ = G t θ′ = 48.9 MPa.', '48.9 MPa', 'tau_max@L04'],
  ['carried', 'MS = 186/(1.5 × 65.7) − 1 = +0.98 in L07.', '+0.98', 'MS:shear-ultimate@L07'],
  ['carried', 'The margin of safety in L04 is therefore +1.84.', '+1.84', 'MS:shear-ultimate@L04'],
  // A margin rounded up, a power of ten, a sign.
  ['rounded up', 'The least margin in shear is MS = +0.89, in L07.', '+0.89', 'MS:shear-ultimate@L07'],
  ['power of ten', 'The torsion constant is 38 642 mm⁴.', '38 642 mm⁴', 'J'],
  ['power of ten', 'The warping constant, 2.7536×10⁵ mm⁶, is about the shear centre.', '2.7536×10⁵ mm⁶', 'Gamma'],
  ['sign', 'The margin in L07 is −0.88.', '−0.88', 'MS:shear-ultimate@L07'],
]

/** The same result stands under more than one key: in rad and in degrees, as the largest and as that of its wall. */
const values = new Map(Object.values(RESULTS).flatMap(evaluation => evaluation.ok ? evaluation.result.outputs.map(output => [output.key, output.value] as const) : []))
const valueOf = (key: string) => values.get(key)

describe('sixty sentences with a planted fault', () => {
  it('are sixty', () => expect(FAULTS).toHaveLength(60))
  it.each(FAULTS)('%s: %s', (_, sentence, found, key) => {
    const doc = readDocument(noteDocument({ 'description': [paragraph(sentence)], 'section-analysis': calculations() }))
    const loose = scanLooseNumbers(doc, RESULTS)
    const number = loose.find(({ text }) => text === found)
    expect(loose.map(({ text, verdict }) => `${text} ${verdict}`)).toContain(`${found} disagreeing`)
    const named = number?.candidates.map(candidate => valueOf(candidate.key)) ?? []
    expect(named.some(value => value !== undefined && Math.abs(value - valueOf(key)!) <= 1e-4 * Math.abs(value))).toBe(true)
    expect(number?.reason).toMatch(/\.$/)
  })
})
