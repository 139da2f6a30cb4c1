/**
 * Catches mail on loopback for the demonstration.
 * Usage: tsx server/cli/mail-catcher.ts <port> <folder>
 */
import { startMailCatcher } from '#server/mail/catcher'

const [port, folder] = process.argv.slice(2)
if (port === undefined || !/^\d+$/.test(port) || folder === undefined) {
  console.error('Usage: mail-catcher <port> <folder>')
  process.exit(2)
}

const catcher = await startMailCatcher({
  port: Number(port), folder, clock: () => new Date(), onCaught: mail => console.log(`caught for ${mail.to}: ${mail.subject}`),
})
console.log(`Catching mail on ${catcher.url} into ${folder}`)

const stop = () => {
  void catcher.close().then(() => process.exit(0))
}
process.once('SIGINT', stop)
process.once('SIGTERM', stop)
