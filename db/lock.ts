import { createHash } from 'node:crypto'
import { unlinkSync } from 'node:fs'
import net from 'node:net'
import { tmpdir } from 'node:os'
import path from 'node:path'

/** Where the lock of a data folder listens: outside any folder that a build or a watcher reads. */
export function lockAddress(dataDirectory: string): string {
  const hash = createHash('sha256').update(path.resolve(dataDirectory)).digest('hex').slice(0, 16)
  return path.join(tmpdir(), `rillpost-${hash}.sock`)
}

function listen(address: string): Promise<net.Server> {
  return new Promise((resolve, reject) => {
    const server = net.createServer((socket) => socket.end(String(process.pid)))
    server.once('error', reject)
    server.listen(address, () => {
      server.unref()
      resolve(server)
    })
  })
}

/** The process that answers at the address, or null where a dead one left its file behind. */
function ownerOf(address: string): Promise<string | null> {
  return new Promise((resolve) => {
    const socket = net.connect(address)
    let answer = ''
    socket.setTimeout(2000, () => socket.destroy(new Error('no answer')))
    socket.on('data', (chunk) => (answer += String(chunk)))
    socket.on('end', () => resolve(answer))
    socket.on('error', (error: NodeJS.ErrnoException) =>
      resolve(error.code === 'ECONNREFUSED' || error.code === 'ENOENT' ? null : 'unknown'),
    )
  })
}

/**
 * Holds a data folder for this process alone. Two processes on one embedded database lose acknowledged
 * rows without a word, so a second one is refused; the kernel frees the lock when its owner dies.
 */
export async function lockDataFolder(dataDirectory: string): Promise<() => void> {
  const address = lockAddress(dataDirectory)
  for (let attempt = 0; attempt < 3; attempt++) {
    try {
      const server = await listen(address)
      return () => server.close()
    } catch (error) {
      if ((error as NodeJS.ErrnoException).code !== 'EADDRINUSE') throw error
      const owner = await ownerOf(address)
      if (owner !== null) {
        throw new Error(`The data folder ${dataDirectory} is already open in process ${owner}.`, {
          cause: error,
        })
      }
      unlinkSync(address)
    }
  }
  throw new Error(`The data folder ${dataDirectory} could not be locked.`)
}
