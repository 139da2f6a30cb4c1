import { createAdministrator } from '#server/commands/create-administrator'
import { connect } from '#server/database/orm'
import { serverClock } from '#server/utils/clock'
import { emailSchema } from '#shared/schemas/people'
import { checkProductionRole } from './check-role'
import { migrate } from './migrate'
import { seed } from './seed'
import { signIns } from './sign-ins'

function needed(name: string): string {
  const value = process.env[name]
  if (!value) throw new Error(`Set ${name}.`)
  return value
}

const commands: Record<string, { usage: string, run: (args: string[]) => Promise<void> }> = {
  'migrate': {
    usage: 'migrate: brings the database to the newest schema',
    run: async () => {
      const done = await migrate(needed('DATABASE_OWNER_URL'), needed('DATABASE_URL'))
      console.log(done.length ? `Migrated: ${done.join(', ')}` : 'The schema is the newest already.')
    },
  },
  'seed': {
    usage: 'seed: makes the demonstration, once',
    run: async () => console.log(await seed(needed('DATABASE_URL'))),
  },
  'sign-ins': {
    usage: 'sign-ins: lists the people of the demonstration',
    run: async () => console.log(signIns()),
  },
  'check-role': {
    usage: 'check-role: refuses an application role that owns a table',
    run: () => checkProductionRole(needed('DATABASE_URL')),
  },
  'create-administrator': {
    usage: 'create-administrator <e-mail> <name>: prints a one-time link',
    run: async ([email, ...name]) => {
      const address = emailSchema.safeParse(email)
      if (!address.success || !name.length) throw new Error('Usage: npm run admin:create -- <e-mail> <name>')
      const orm = await connect(needed('DATABASE_URL'))
      try {
        console.log(await createAdministrator(orm.em, serverClock, { email: address.data, name: name.join(' ') }))
      } finally {
        await orm.close()
      }
    },
  },
}

/** Runs one command of the terminal by its name. @throws with the list of commands when there is none of that name. */
export async function runCommandLine(name: string, args: string[]): Promise<void> {
  const command = commands[name]
  if (!command) throw new Error(`Commands:\n${Object.values(commands).map(c => `  ${c.usage}`).join('\n')}`)
  await command.run(args)
}
