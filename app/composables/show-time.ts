/** Times are UTC everywhere, so that a trail reads the same in every office. */
const two = (n: number) => String(n).padStart(2, '0')

/** `2026-10-12 09:00`, with seconds where the order of acts matters. */
export function showTime(iso: string, seconds = false): string {
  const at = new Date(iso)
  if (Number.isNaN(at.getTime())) return iso
  const day = `${at.getUTCFullYear()}-${two(at.getUTCMonth() + 1)}-${two(at.getUTCDate())}`
  return `${day} ${two(at.getUTCHours())}:${two(at.getUTCMinutes())}${seconds ? `:${two(at.getUTCSeconds())}` : ''}`
}

/** `now`, `25 min`, `3 h`, `41 d`: whole units passed, never rounded up. */
export function showAge(iso: string, now: number): string {
  const minutes = Math.floor((now - new Date(iso).getTime()) / 60_000)
  if (!Number.isFinite(minutes)) return ''
  if (minutes < 1) return 'now'
  if (minutes < 60) return `${minutes} min`
  if (minutes < 48 * 60) return `${Math.floor(minutes / 60)} h`
  return `${Math.floor(minutes / 1440)} d`
}
