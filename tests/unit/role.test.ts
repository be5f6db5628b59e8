import { describe, expect, it } from 'vitest'
import { allow, may, NotAllowedError, rolesFor, type Act, type Role } from '@/lib/domain/role'

const roles: readonly Role[] = ['agent', 'coordinator', 'visitor']

describe('who may do what', () => {
  it.each<[Act, readonly Role[]]>([
    ['work tickets', ['agent', 'coordinator']],
    ['see households', ['agent', 'coordinator']],
    ['write wording', ['coordinator']],
    ['keep stock', ['coordinator']],
    ['set up areas', ['coordinator']],
    ['see own visits', ['visitor', 'coordinator']],
  ])('%s: %j and nobody else', (act, allowed) => {
    expect(roles.filter((role) => may(role, act)).toSorted()).toEqual(allowed.toSorted())
    expect(rolesFor(act).toSorted()).toEqual(allowed.toSorted())
  })

  it('asks for no role where everybody may come in', () => {
    expect(rolesFor('public')).toEqual([])
  })

  it('stops a use case that the role does not cover, and names it', () => {
    const actor = { staffId: 's', name: 'Vera', role: 'visitor', languages: [] } as const
    expect(() => allow(actor, 'work tickets')).toThrow(NotAllowedError)
    expect(() => allow(actor, 'work tickets')).toThrow('Your role may not do this: work tickets.')
    expect(() => allow(actor, 'see own visits')).not.toThrow()
  })
})
