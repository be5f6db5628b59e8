import { createInterface } from 'node:readline/promises'
import { parseArgs } from 'node:util'
import { getDeps } from '@/lib/deps'
import { faultWords } from '@/lib/log'
import { staffInputSchema } from '@/lib/schemas/staff'
import { addStaff } from '@/lib/services/add-staff'

const usage =
  'npm run staff:add -- --email you@example.org --name "Your Name" --role coordinator --languages en,es'

/** The password comes from the terminal or a pipe, never from the command line, where others could read it. */
async function askPassword(): Promise<string> {
  const terminal = createInterface({ input: process.stdin, output: process.stderr })
  const password = await terminal.question('Password (at least 12 characters): ')
  terminal.close()
  return password
}

async function main(): Promise<number> {
  const { values } = parseArgs({
    options: {
      email: { type: 'string' },
      name: { type: 'string' },
      role: { type: 'string' },
      languages: { type: 'string', default: 'en' },
    },
  })
  if (!values.email || !values.name || !values.role) {
    console.error(`Give an e-mail, a name and a role:\n  ${usage}`)
    return 1
  }
  const input = staffInputSchema.safeParse({
    ...values,
    languages: values.languages.split(',').map((code) => code.trim()),
    password: await askPassword(),
  })
  if (!input.success) {
    for (const issue of input.error.issues) console.error(issue.message)
    return 1
  }
  const deps = await getDeps()
  const added = await addStaff(deps, input.data)
  await deps.close()
  console.error(added.ok ? `${values.name} can sign in as ${values.role}.` : added.reason)
  return added.ok ? 0 : 1
}

main().then(
  (code) => process.exit(code),
  (error: unknown) => {
    console.error(faultWords(error))
    process.exit(1)
  },
)
