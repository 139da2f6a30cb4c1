/**
 * The large-twist effect (methods reference §7.7): fibres far from the axis
 * lengthen, and carry torque with the cube of the rate of twist.
 * N, mm, MPa, rad/mm.
 */
import type { Refusal } from '#shared/torsion/section'
import { refusal } from '#shared/torsion/section'

/** Up to here the linear result is accepted; above `wagnerStop` it is not used. */
export const wagnerCaution = 0.02
export const wagnerStop = 0.1

export interface WagnerInput {
  readonly E: number
  readonly GJ: number
  /** ∫ρ⁴dA − (∫ρ²dA)²/A about the shear centre, mm⁶. */
  readonly In: number
  /** ∫ρ²dA about the shear centre, mm⁴. */
  readonly Ips: number
  readonly A: number
  /** Distance of the farthest fibre from the shear centre, mm. */
  readonly rhoMax: number
  /** Rate of twist, rad/mm. */
  readonly rate: number
}

export interface WagnerEffect {
  readonly ok: true
  /** E·In·θ′²/(2GJ): the cubic part of the torque over the linear part. */
  readonly ratio: number
  readonly linearTorque: number
  readonly torque: number
  /** Longitudinal stress at the farthest fibre, tension positive, and at the axis. */
  readonly edgeStress: number
  readonly axisStress: number
}

const finite = (...values: number[]): boolean => values.every(value => Number.isFinite(value))

/** Large-twist torque and longitudinal stress at a given rate of twist, ends free to come together. */
export function wagner(input: WagnerInput): WagnerEffect | Refusal {
  const { E, GJ, In, Ips, A, rhoMax, rate } = input
  if (!finite(E, GJ, In, Ips, A, rhoMax, rate)) return refusal('The large-twist check needs finite numbers.')
  if (!(E > 0 && GJ > 0 && A > 0)) return refusal('The large-twist check needs a modulus of elasticity and a torsional stiffness greater than zero.')
  const linearTorque = GJ * rate
  const half = 0.5 * E * rate * rate
  const result: WagnerEffect = {
    ok: true,
    ratio: half * In / GJ,
    linearTorque,
    torque: linearTorque + half * In * rate,
    edgeStress: half * (rhoMax * rhoMax - Ips / A),
    axisStress: -half * Ips / A,
  }
  return finite(result.ratio, result.torque, result.edgeStress, result.axisStress) ? result : refusal('The rate of twist is too large for the large-twist check.')
}

export interface Strip { readonly b: number, readonly t: number, readonly E: number, readonly G: number }

/** In of a flat strip b × t about its middle, t·b⁵/180, mm⁶. */
export const stripIn = ({ b, t }: Pick<Strip, 'b' | 't'>): number => t * b ** 5 / 180

/** A flat strip as `wagner` takes it, with J = b·t³/3. */
export function stripAsWagner({ b, t, E, G }: Strip, rate: number): WagnerInput {
  return { E, GJ: G * b * t ** 3 / 3, In: stripIn({ b, t }), Ips: t * b ** 3 / 12, A: b * t, rhoMax: b / 2, rate }
}

/** The rate of twist at which the ratio of a flat strip reaches a limit: √(120·limit·G/E)·t/b²; 1.549 (t/b²)√(G/E) at 2 %. */
export const stripRateLimit = ({ b, t, E, G }: Strip, limit = wagnerCaution): number => Math.sqrt(120 * limit * G / E) * t / (b * b)
