import { listStageMonths } from '@/db/queries/kit-ahead'
import type { Deps } from '@/lib/deps'
import type { CycleLengths } from '@/lib/domain/cycle-words'
import { allow, type Actor } from '@/lib/domain/role'
import type { Cycles } from '@/lib/domain/round-ahead'
import type { Settings } from '@/lib/domain/settings'
import { settingsNow } from './settings-now'

/** The cycles that stand, as the plan ahead wants them. */
export function cyclesOf({ wash }: Settings): Cycles {
  return { wash, flowCheckDays: wash.flowCheckDays }
}

/** The cycles that stand, as the what-if of the rounds page begins. */
export async function cyclesStanding(deps: Deps, actor: Actor): Promise<CycleLengths> {
  allow(actor, 'see rounds')
  const { wash, flowCheckDays } = cyclesOf(await settingsNow(deps.store.db))
  const months = await listStageMonths(deps.store.db)
  const monthsOf = (position: number) => {
    const [one, ...others] = months.filter((stage) => stage.position === position)
    return one && others.length === 0 ? one.changeMonths : null
  }
  return {
    washClear: wash.days.clear,
    washCloudy: wash.days.cloudy,
    washVeryCloudy: wash.days['very cloudy'],
    wetPercent: Math.round(wash.wetShare * 100),
    change1: monthsOf(1),
    change2: monthsOf(2),
    change3: monthsOf(3),
    flowCheckDays,
  }
}
