import { createServer } from 'node:net'

/** Whether a program could listen there now. */
export function isFree(port, host = '127.0.0.1') {
  return new Promise((resolve) => {
    const probe = createServer()
    probe.once('error', () => resolve(false))
    probe.listen({ port, host, exclusive: true }, () => probe.close(() => resolve(true)))
  })
}

/** One clear line for each port that is taken; none when all are free. */
export async function takenPorts(wanted, host) {
  const lines = []
  for (const { what, port, variable } of wanted) {
    if (await isFree(port, host)) continue
    lines.push(
      `Port ${port}, wanted for ${what}, is taken. Stop the program that holds it, or choose another with ${variable}=….`,
    )
  }
  return lines
}
