// A reader that has seen enough (`| head`) is no failure of the command.
process.stdout.on('error', (error: NodeJS.ErrnoException) => {
  if (error.code !== 'EPIPE') throw error
})

/** Lines or JSON on standard output. */
export const print = (text: string): void => void process.stdout.write(`${text}\n`)
