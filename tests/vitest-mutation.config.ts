import { defineConfig } from 'vitest/config'
import base from './vitest.config'

/** The unit and outside tests that concern the mutated files: the others would only cost time. */
export default defineConfig({
  root: base.root,
  resolve: base.resolve,
  test: {
    environment: 'node',
    include: [
      'tests/unit/{flow,cycle,day,round,ticket,walk,harm,consent}*.test.ts',
      'tests/outside/{care,dates,flow,opting-out,unwell,walk,water}.test.ts',
    ],
  },
})
