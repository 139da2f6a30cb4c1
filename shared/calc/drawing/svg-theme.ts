/** Colours of a sketch per ground; the same values as the design tokens, written out because a PDF knows no CSS variables. */
export type DrawingTheme = 'light' | 'dark' | 'print'

export interface Palette { paper: string, ink: string, ink2: string, ink3: string, rule: string, accent: string, ramp: readonly string[] }

const DAY_RAMP = ['#EDEBE0', '#C3D4C9', '#99BEB3', '#6DA89D', '#4B9085', '#2B776D', '#145E57', '#1D4245', '#1C2733'] as const
const NIGHT_RAMP = ['#2B333A', '#304C4D', '#316562', '#337F77', '#43988E', '#53B2A5', '#7CC8BA', '#B7D9CB', '#EDE9DC'] as const
const DAY = { ink: '#1C2733', ink2: '#424D58', ink3: '#5C646C', rule: '#8E887A', accent: '#0E665C', ramp: DAY_RAMP }

const PALETTES: Record<DrawingTheme, Palette> = {
  light: { paper: '#FCFBF7', ...DAY },
  print: { paper: '#FFFFFF', ...DAY },
  dark: { paper: '#1D2329', ink: '#E6E2D8', ink2: '#BEBFBC', ink3: '#A0A5A8', rule: '#767E86', accent: '#5CC0B2', ramp: NIGHT_RAMP },
}

export function paletteOf(theme: DrawingTheme): Palette {
  return PALETTES[theme]
}

/** Colour of a level from 0 to 1. The steps are even in lightness and close together, so a straight mix between two is enough. */
export function rampColour(palette: Palette, level: number): string {
  const steps = palette.ramp.length - 1
  const place = Math.min(Math.max(level, 0), 1) * steps
  const low = Math.min(Math.floor(place), steps - 1)
  const share = place - low
  const a = channels(palette.ramp[low] ?? '#000000')
  const b = channels(palette.ramp[low + 1] ?? '#000000')
  return `#${a.map((v, i) => Math.round(v + (((b[i] ?? v) - v) * share)).toString(16).padStart(2, '0')).join('').toUpperCase()}`
}

function channels(hex: string): number[] {
  return [1, 3, 5].map(i => Number.parseInt(hex.slice(i, i + 2), 16))
}
