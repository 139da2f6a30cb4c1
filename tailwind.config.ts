import type { Config } from 'tailwindcss'

const ink = (name: string) => `rgb(var(--c-${name}) / <alpha-value>)`
const inks = ['paper', 'desk', 'well', 'field', 'ink', 'ink2', 'ink3', 'hair', 'rule', 'accent', 'caution', 'stop', 'pass', 'info', 'on-accent', 'accent-w', 'caution-w', 'stop-w', 'pass-w', 'info-w']

/** The tokens of app/assets/css/tokens.css, by the names the screens use. */
export default {
  content: ['./app/**/*.{vue,ts}'],
  darkMode: ['selector', '[data-theme="dark"]'],
  theme: {
    colors: { ...Object.fromEntries(inks.map(name => [name, ink(name)])), transparent: 'transparent', current: 'currentColor' },
    fontFamily: { serif: 'var(--serif)', sans: 'var(--sans)', code: 'var(--code)' },
    fontSize: {
      mini: ['11.5px', '16px'], small: ['13px', '18px'], ui: ['14px', '20px'], text: ['17px', '27px'],
      h2: ['21px', '27px'], h1: ['30px', '36px'], margin: ['26px', '30px'],
    },
    spacing: { 0: '0', px: '1px', half: '2px', 1: '4px', 2: '9px', 3: '13px', 4: '18px', 5: '27px', 6: '40px', 7: '54px' },
    borderWidth: { DEFAULT: '1px', 0: '0', rule: '1.5px', heavy: '2.5px' },
    borderRadius: { DEFAULT: '2px', none: '0' },
    transitionDuration: { press: '80ms', open: '160ms', settle: '240ms' },
    boxShadow: { focus: 'var(--focus-ring)', none: 'none' },
    extend: {
      maxWidth: { measure: '596px', sheet: '1132px', calc: '756px' },
      screens: { drawer: '1130px', rail: '1440px' },
    },
  },
} satisfies Config
