/**
 * The time in which the demonstration plays. Its present is Monday 2026-10-12,
 * 09:00. Seeded before that day, everything is moved back by whole weeks, so
 * that nothing in the trail lies in the future and weekdays stay as they are.
 */
const PRESENT = Date.UTC(2026, 9, 12, 9, 0)
const WEEK = 7 * 86_400_000
/** The day before everything: the administrator adds people and projects. */
export const FIRST_DAY = '2026-02-02'

export interface DemoClock {
  /** `2026-06-17 17:12`, in the scenario's own time, as a moment. Throws on another form. */
  at: (when: string) => Date
}

export function demoClock(now: Date): DemoClock {
  const shift = Math.max(0, Math.ceil((PRESENT - now.getTime()) / WEEK)) * WEEK
  return {
    at(when) {
      const moment = Date.parse(`${when.replace(' ', 'T')}:00Z`)
      if (!/^\d{4}-\d\d-\d\d \d\d:\d\d$/.test(when) || Number.isNaN(moment)) throw new Error(`"${when}" is no moment of the scenario`)
      return new Date(moment - shift)
    },
  }
}
