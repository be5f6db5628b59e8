import { defineConfig } from 'vitest/config'
import base from './vitest.config'

/**
 * The unit and outside tests that concern the mutated files: the others would only cost time, and so would
 * outside/planning, which goes through every change of every clock.
 */
export default defineConfig({
  root: base.root,
  resolve: base.resolve,
  test: {
    environment: 'node',
    testTimeout: 60_000,
    include: [
      'tests/unit/{flow,cycle,day,round,ticket,walk,harm,consent}*.test.ts',
      'tests/outside/{care,dates,flow,opting-out,unwell,walk,water}.test.ts',
    ],
  },
})
