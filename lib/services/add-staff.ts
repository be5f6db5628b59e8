import { hash } from '@node-rs/argon2'
import { insertAudit, insertStaff } from '@/db/queries/staff'
import type { Deps } from '@/lib/deps'
import type { StaffInput } from '@/lib/schemas/staff'

/**
 * Gives a person an account. Only the command line calls it: whoever can run a command on the server may
 * already read everything, so no role is asked for.
 */
export async function addStaff(
  deps: Pick<Deps, 'store' | 'clock'>,
  input: StaffInput,
): Promise<{ ok: true; staffId: string } | { ok: false; reason: string }> {
  const passwordHash = await hash(input.password)
  const at = deps.clock.now()
  return deps.store.transaction(async (tx) => {
    const { password: _password, ...who } = input
    const row = await insertStaff(tx, { ...who, passwordHash, createdAt: at })
    if (!row) return { ok: false, reason: 'Somebody has an account with this e-mail already.' }
    await insertAudit(tx, {
      staffId: null,
      act: 'add staff',
      subject: 'staff',
      subjectId: row.id,
      detail: { role: row.role },
      at,
    })
    return { ok: true, staffId: row.id }
  })
}
