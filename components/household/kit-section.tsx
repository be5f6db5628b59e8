import type { KitView } from '@/lib/schemas/household'
import { Column } from '../kit/column'
import { FlowChart } from './flow-chart'
import { LifeLine } from './life-line'

type KitSectionProps = { kit: KitView; today: string; timeZone: string }

/** A kit: how it stands, how it flows, its life on the line. */
export function KitSection({ kit, today, timeZone }: KitSectionProps) {
  const name = `Kit ${kit.number}`
  return (
    <section aria-label={name} className="mt-7">
      <div className="pl-lead">
        <h2 className="font-title text-lg font-semibold">
          Kit <span className="font-mono">{kit.number}</span>{' '}
          <span
            className={`font-sans text-sm font-normal ${kit.state === 'in use' ? 'text-faint' : 'text-clay'}`}
          >
            {kit.model}, {kit.state}
          </span>
        </h2>
        <div className="mt-3 grid grid-cols-[3.5rem_minmax(0,1fr)] gap-5">
          <Column size="small" {...kit.column} className="h-auto w-14" />
          <FlowChart {...kit.flow} timeZone={timeZone} />
        </div>
        <h3 className="mt-7 mb-1 font-title text-lg font-semibold">Its life</h3>
      </div>
      <LifeLine past={kit.past} planned={kit.planned} today={today} />
    </section>
  )
}
