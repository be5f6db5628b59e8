import { and, eq, isNull, sql } from 'drizzle-orm'
import type { Handle } from '../client'
import { audit, staff } from '../schema/staff'

export async function findStaffByEmail(db: Handle, email: string) {
  const [row] = await db
    .select()
    .from(staff)
    .where(eq(sql`lower(${staff.email})`, email.toLowerCase()))
  return row ?? null
}

export async function findStaff(db: Handle, staffId: string) {
  const [row] = await db.select().from(staff).where(eq(staff.id, staffId))
  return row ?? null
}

export async function insertStaff(db: Handle, row: typeof staff.$inferInsert) {
  const [made] = await db.insert(staff).values(row).onConflictDoNothing().returning()
  return made ?? null
}

export async function insertAudit(db: Handle, row: typeof audit.$inferInsert) {
  await db.insert(audit).values(row)
}

/** Coordinators with an open account, to be told of what cannot wait. */
export async function listCoordinators(db: Handle) {
  return db
    .select({ id: staff.id, email: staff.email })
    .from(staff)
    .where(and(eq(staff.role, 'coordinator'), isNull(staff.disabledAt)))
    .limit(50)
}
