import { spawn } from 'node:child_process'
import { existsSync, mkdtempSync, readFileSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import path from 'node:path'
import { pathToFileURL } from 'node:url'
import { afterEach, beforeEach, expect, test } from 'vitest'
import { childGroup } from '@/lib/commands/children.mjs'

type Death = { name: string; how: string; lastLines: string }

let folder = ''
beforeEach(() => {
  folder = mkdtempSync(path.join(tmpdir(), 'rillpost-children-'))
})
afterEach(() => rmSync(folder, { recursive: true }))

/** A program that says it is ready, and writes its name into a file when it is asked to stop. */
function patient(name: string) {
  const order = path.join(folder, 'order')
  const source = `
    process.on('SIGTERM', () => setTimeout(() => {
      require('node:fs').appendFileSync(${JSON.stringify(order)}, '${name} ')
      process.exit(0)
    }, 50))
    setInterval(() => undefined, 1000)
    console.log('ready')`
  return { name, parameters: ['--eval', source], environment: process.env }
}

async function untilReady(...names: string[]) {
  const ready = (name: string) => {
    const file = path.join(folder, `${name}.log`)
    return existsSync(file) && readFileSync(file, 'utf8').includes('ready')
  }
  await expect.poll(() => names.every(ready), { timeout: 15_000 }).toBe(true)
}

test('programs are stopped in the reverse order of their start, each to its end', async () => {
  const deaths: Death[] = []
  const group = childGroup({ logFolder: folder, onDeath: (death: Death) => deaths.push(death) })
  group.start(patient('mail'))
  group.start(patient('desk'))
  await untilReady('mail', 'desk')

  await group.stop()

  expect(readFileSync(path.join(folder, 'order'), 'utf8')).toBe('desk mail ')
  expect(deaths).toEqual([])
}, 30_000)

test('a program that ends by itself is told, with its last words', async () => {
  const death = await new Promise<Death>((resolve) => {
    const group = childGroup({ logFolder: folder, onDeath: resolve })
    const source = `console.error('no water in the well'); process.exit(3)`
    group.start({ name: 'carrier', parameters: ['--eval', source], environment: process.env })
  })
  expect(death).toEqual({ name: 'carrier', how: 'code 3', lastLines: 'no water in the well' })
}, 30_000)

test('a program that does not stop in its time is killed', async () => {
  const deaf = `process.on('SIGTERM', () => undefined); setInterval(() => undefined, 1000); console.log('ready')`
  const group = childGroup({ logFolder: folder, graceMilliseconds: 200, onDeath: () => undefined })
  const child = group.start({
    name: 'deaf',
    parameters: ['--eval', deaf],
    environment: process.env,
  })
  await untilReady('deaf')
  await group.stop()
  expect(child.signalCode).toBe('SIGKILL')
}, 30_000)

test('a parent that is killed outright leaves no program behind', async () => {
  const { parameters } = patient('desk')
  const children = pathToFileURL(path.resolve('lib/commands/children.mjs')).href
  const source = `
    const { childGroup } = await import(${JSON.stringify(children)})
    const group = childGroup({ logFolder: ${JSON.stringify(folder)}, onDeath: () => undefined })
    group.start({ name: 'desk', parameters: ${JSON.stringify(parameters)}, environment: process.env })`
  const parent = spawn(process.execPath, ['--input-type=module', '--eval', source])
  await untilReady('desk')

  parent.kill('SIGKILL')

  const order = path.join(folder, 'order')
  await expect
    .poll(() => existsSync(order) && readFileSync(order, 'utf8'), { timeout: 15_000 })
    .toBe('desk ')
}, 30_000)
