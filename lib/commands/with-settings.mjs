/**
 * Loaded before a command of the real desk: the settings of `.env` join those of the environment, which win. It must
 * come first, since modules may read settings as they load.
 */
import { existsSync } from 'node:fs'
import path from 'node:path'
import { root } from './prepare.mjs'

process.chdir(root)
const file = path.join(root, '.env')
if (existsSync(file)) process.loadEnvFile(file)
