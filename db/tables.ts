// Drizzle wants one object of all tables; a table's own file stays the place to import it from.
import * as area from './schema/area'
import * as consent from './schema/consent'
import * as household from './schema/household'
import * as kit from './schema/kit'
import * as part from './schema/part'
import * as promise from './schema/promise'
import * as reading from './schema/reading'
import * as replyWord from './schema/reply-word'
import * as staff from './schema/staff'
import * as stock from './schema/stock'
import * as text from './schema/text'
import * as ticket from './schema/ticket'
import * as visit from './schema/visit'
import * as wording from './schema/wording'

export const tables = {
  ...area,
  ...consent,
  ...household,
  ...kit,
  ...part,
  ...promise,
  ...reading,
  ...replyWord,
  ...stock,
  ...staff,
  ...text,
  ...ticket,
  ...visit,
  ...wording,
}
