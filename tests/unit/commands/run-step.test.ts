import { expect, test } from 'vitest'
import { runProgram } from '@/tests/setup/run-step.mjs'

const node = process.execPath

test('a program that ends well succeeded, with its output kept', async () => {
  const parameters = ['--eval', `console.log('clear water')`]
  const result = await runProgram({ command: node, parameters, limitSeconds: 20 })
  expect(result).toMatchObject({ succeeded: true, output: 'clear water\n' })
})

test('a program that ends badly did not succeed', async () => {
  const parameters = ['--eval', 'process.exit(2)']
  const result = await runProgram({ command: node, parameters, limitSeconds: 20 })
  expect(result.succeeded).toBe(false)
})

test('a program that is not there did not succeed, and says so', async () => {
  const result = await runProgram({ command: 'no-such-program', parameters: [], limitSeconds: 20 })
  expect(result.succeeded).toBe(false)
  expect(result.output).toContain('no-such-program could not be run')
})

test('a program over its limit is ended together with what it started', async () => {
  const grandchild = `setInterval(() => undefined, 1000)`
  const source = `
    const { spawn } = require('node:child_process')
    spawn(process.execPath, ['--eval', ${JSON.stringify(grandchild)}], { stdio: 'inherit' })`
  const result = await runProgram({
    command: node,
    parameters: ['--eval', source],
    limitSeconds: 2,
  })
  expect(result.succeeded).toBe(false)
  expect(result.output).toContain('it took longer than 2 seconds')
  // Whatever still ran would hold the output open, and the run would not have ended.
  expect(result.seconds).toBeLessThan(9)
}, 20_000)
