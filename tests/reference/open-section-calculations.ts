/**
 * Values of whole open-section calculations computed by independent programs: a centre-line graph program
 * with exact bends, plain arithmetic on its results, and for the angle a separate evaluation of the
 * published junction formula. Six figures, margins at full precision. None comes from this code.
 */
export interface ReferenceValue { key: string, value: number, tolerance: number, source: string }

const graph = 'independent centre-line graph program'
const arithmetic = 'plain arithmetic on the values of the independent graph program'
const six = 6e-6
const full = 1e-9
const of = (source: string, tolerance: number, values: Record<string, number>): ReferenceValue[] =>
  Object.entries(values).map(([key, value]) => ({ key, value, tolerance, source }))

const degree = Math.PI / 180

/** Hat stiffener, 1.6 mm sheet, inside bends 3.2 mm, imposed rates of twist S01 to S12. */
export const hatValues: ReferenceValue[] = [
  ...of(graph, six, { 'J_plain': 156.916, 'J': 155.539, 'A': 183.886, 'y_C': 14.739, 'y_S': 38.4475, 'Gamma': 2753560, 'omega_max': 325.663, 'developed': 114.929, 'slenderness:a': 9.375 }),
  ...of('closed form of a concentric bend, evaluated separately', six, { 'Kc:2': 1.08288 }),
  ...of(arithmetic, six, { 'T@S07': 183.566, 'T@S10': 219.53, 'tau:c@S10': 2.25826, 'tau_corner:3@S07': 2.04481, 'tau_corner:3@S10': 2.44542, 'tau_corner:2@S01': 0.534154, 'tau_corner:2@S11': 1.05996 }),
  ...of(arithmetic, full, { 'MS:corner-ultimate@S10': 72.33425850455178, 'MS:corner-yield@S10': 75.49450999916112 }),
]

/** Lipped channel, 2.5 mm sheet, inside bends 5.0 mm, torques L01 to L06 in lbf·in over 410 mm, 1.50° allowed. */
export const lippedChannelValues: ReferenceValue[] = [
  ...of(graph, six, { J_plain: 944.114, J: 935.908, x_S: -21.895, Gamma: 196413000 }),
  ...of('closed form of a concentric bend, evaluated separately', six, { 'Kc:2': 1.08288 }),
  ...of(arithmetic, six, {
    'slenderness:a': 6.4, 'kL': 0.554314, 'T@L04': 1796.46, 'theta@L04': 7.32627e-5, 'twist@L04': 0.0300377, 'twist_deg@L04': 1.72103 * degree, 'twist_deg@L02': 1.54785 * degree,
    'tau_corner:2@L04': 5.19642, 'T@L01': 1084.65, 'T@L06': 1321.92,
  }),
  // Printed to six figures and agreeing to five: the independent integral round the bends is coarser.
  ...of(arithmetic, 2e-5, { 'wagner@L04': 0.00892741 }),
  ...of(arithmetic, full, {
    'MS:twist@L01': 0.4435363823330736, 'MS:twist@L02': -0.030912638433740813, 'MS:twist@L03': 0.7997336714801957, 'MS:twist@L04': -0.12843086349701216,
    'MS:twist@L05': 0.09983724368234181, 'MS:twist@L06': 0.18444010858098348, 'MS:corner-ultimate@L04': 22.862579865524808, 'MS:corner-ultimate@L06': 30.126518903556097,
    'MS:corner-yield@L04': 25.776396169755206, 'MS': -0.12843086349701216,
  }),
]

/** The same carrier in 3.0 mm sheet, mid-line held, and in 2.8 mm. */
export const lippedChannel30: ReferenceValue[] = [...of(graph, six, { J: 1610.55 }), ...of(arithmetic, full, { 'MS:twist@L04': 0.49983303172781723 })]
export const lippedChannel28: ReferenceValue[] = of(arithmetic, full, { 'MS:twist@L04': 0.2214486360233039 })

const inch4 = 416231.4256
/** Machined angle bracket 2.00 × 1.55 × 0.250 in, fillet 0.190 in. */
export const bracketValues: ReferenceValue[] = [
  ...of('junction formula evaluated by a separate program', six, { J: 0.0178184 * inch4, J_plain: 0.0171875 * inch4, J_bulge: 0.00186138 * inch4, J_ends: -0.00123047 * inch4 }),
  ...of('table of machined corners, linear in r/t, evaluated separately', six, { 'Kc:2': 1.48977 }),
]
