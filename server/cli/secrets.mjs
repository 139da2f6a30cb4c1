// Secrets of this checkout: made once, readable by their owner only.
import { randomBytes } from 'node:crypto'
import { chmodSync, existsSync, mkdirSync, readFileSync, writeFileSync } from 'node:fs'
import { join } from 'node:path'
import { root } from './shell.mjs'

const secret = () => randomBytes(24).toString('base64url')

export function loadSecrets() {
  const folder = join(root, '.data')
  mkdirSync(folder, { recursive: true })
  const file = join(folder, 'secrets.json')
  const known = existsSync(file) ? JSON.parse(readFileSync(file, 'utf8')) : {}
  const all = { authSecret: secret(), adminPassword: secret(), ownerPassword: secret(), appPassword: secret(), ...known }
  if (Object.keys(all).length !== Object.keys(known).length) {
    writeFileSync(file, JSON.stringify(all, null, 2), { mode: 0o600 })
    chmodSync(file, 0o600)
  }
  return { ...all, file }
}

/** Remembers a port or another fact beside the secrets. */
export function remember(key, value) {
  const { file, ...all } = loadSecrets()
  writeFileSync(file, JSON.stringify({ ...all, [key]: value }, null, 2), { mode: 0o600 })
}
