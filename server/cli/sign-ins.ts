import { DEMO_MAKER, DEMO_PASSWORD, DEMO_SIGN_INS } from '#server/database/seeders/demo/people'

/** The people of the demonstration and how they sign in, as a table for the terminal. */
export function signIns(): string {
  const widest = (pick: (one: (typeof DEMO_SIGN_INS)[number]) => string) => Math.max(...DEMO_SIGN_INS.map(one => pick(one).length))
  const [email, name] = [widest(one => one.email), widest(one => one.name)]
  const lines = DEMO_SIGN_INS.map(one => `  ${one.email.padEnd(email)}  ${one.name.padEnd(name)}  ${one.duty}`)
  return [`People of ${DEMO_MAKER} (invented). Everybody's password is ${DEMO_PASSWORD}`, ...lines].join('\n')
}
