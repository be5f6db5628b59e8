import { spawn } from 'node:child_process'
import { existsSync, renameSync, rmSync } from 'node:fs'
import path from 'node:path'
import { privateFolder } from './practice.mjs'
import { fail, root } from './prepare.mjs'

/**
 * The folder of the demo world, built on the first start. It is a folder of its own inside the data folder, so that
 * the demo never touches what a real programme keeps there, and it comes into being by one rename: a build that was
 * cut short leaves nothing that could be taken for a finished one.
 */
export async function ensureDemo({ dataFolder, environment }) {
  const finished = path.join(dataFolder, 'demo')
  if (existsSync(finished)) return finished
  const unfinished = path.join(dataFolder, 'demo-unfinished')
  rmSync(unfinished, { recursive: true, force: true })
  privateFolder(unfinished)
  console.log('Building the demo world (once; up to a minute) …')
  await buildDemo(environment(unfinished))
  renameSync(unfinished, finished)
  return finished
}

function buildDemo(environment) {
  return new Promise((resolve) => {
    const build = spawn(
      process.execPath,
      ['--import', 'tsx', path.join('db', 'seed', 'build.ts')],
      {
        cwd: root,
        env: environment,
        stdio: ['ignore', 'inherit', 'inherit'],
      },
    )
    build.once('exit', (code) => {
      if (code !== 0) fail('The demo world could not be built.')
      resolve()
    })
  })
}
