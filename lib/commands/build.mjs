/** `npm run build`: builds the desk whether or not a build is there. */
import { build, ensureInstalled, ensureNode } from './prepare.mjs'

ensureNode()
ensureInstalled()
build()
