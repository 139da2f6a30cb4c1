/** Numbers inside sentences. */
import { significant, showQuantity } from '#shared/units/display'

/** Four significant figures, enough to recognise a value in a sentence. */
export const figure = (value: number): string => significant(value, 4)

export const degrees = (radians: number): number => radians * 180 / Math.PI

/** A length in the unit system of the calculation. */
export const lengthShown = (units: 'SI' | 'US', mm: number): string => showQuantity(mm, 'length', units === 'SI' ? 'mm' : 'in')

/** Below a threshold by more than the last digits of binary arithmetic, so that a value typed to sit on it passes. */
export const below = (value: number, threshold: number): boolean => value < threshold * (1 - 1e-12)

/** The first letter of a sentence. */
export const capital = (text: string): string => text.charAt(0).toUpperCase() + text.slice(1)
