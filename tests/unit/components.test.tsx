import { renderToStaticMarkup } from 'react-dom/server'
import { describe, expect, test } from 'vitest'
import { FlowChart } from '@/components/household/flow-chart'
import { Column } from '@/components/kit/column'
import { Cutaway } from '@/components/kit/cutaway'
import type { ColumnStage } from '@/components/kit/stage'
import { Slip } from '@/components/text/slip'
import { Bead } from '@/components/ui/bead'
import { PartBoxes } from '@/components/ui/part-boxes'
import { Ruler } from '@/components/ui/ruler'

const good: ColumnStage = { position: 1, left: 0.5, state: 'good' }

function column(stage: ColumnStage, size: 'small' | 'large' = 'small'): string {
  return renderToStaticMarkup(
    <Column size={size} stages={[stage]} level={0.5} description="a kit" />,
  )
}

describe('the column', () => {
  test.each(['small', 'large'] as const)('%s draws each state of a stage differently', (size) => {
    const states = ['good', 'due', 'overdue', 'out'] as const
    const drawn = states.map((state) => column({ ...good, state }, size))
    expect(new Set(drawn).size).toBe(states.length)
  })

  test.each(['small', 'large'] as const)('%s tells no reading from no flow', (size) => {
    const drawn = [null, 0].map((level) =>
      renderToStaticMarkup(<Column size={size} stages={[]} level={level} description="a kit" />),
    )
    expect(drawn[0]).not.toBe(drawn[1])
  })

  test('two on a page do not share the ids of their patterns', () => {
    const page = renderToStaticMarkup(
      <>
        <Column size="small" stages={[good]} level={1} description="one" />
        <Column size="large" stages={[good]} level={1} description="two" />
      </>,
    )
    const ids = [...page.matchAll(/ id="([^"]+)"/g)].map((match) => match[1])
    expect(ids.length).toBeGreaterThan(2)
    expect(new Set(ids).size).toBe(ids.length)
  })

  test('it is named by its description, and shares beyond 0 and 1 stay inside it', () => {
    const drawn = column({ ...good, left: 7 })
    expect(drawn).toContain('aria-label="a kit"')
    expect(drawn).toBe(column({ ...good, left: 1 }))
    expect(column({ ...good, left: -1 })).toBe(column({ ...good, left: 0 }))
  })
})

describe('what is drawn on the server', () => {
  test('never carries a style attribute, which the page policy would drop', () => {
    const page = renderToStaticMarkup(
      <>
        <Cutaway
          stages={[good]}
          level={0.2}
          description="a kit"
          labels={[{ at: 1, title: 'Cloth stage full', word: 'likely', odds: '5 in 10' }]}
        />
        <Slip
          direction="in"
          body="12"
          at="2026-03-03T06:31:00Z"
          time="06:31"
          receipt="full"
          receiptWords="arrived"
        />
        <Bead state="half" label="on its way" />
        <PartBoxes parts={3} />
        <Ruler units={90} perPart={67} segments={2} encoding="UCS-2" offending={['ç']} />
        <FlowChart
          points={[{ at: Date.UTC(2026, 2, 3), litresPerHour: 9.8 }]}
          needLitresPerHour={4}
          forecast={{ kind: 'too few' }}
          forecastWords="Too few readings."
          timeZone="America/Bogota"
        />
      </>,
    )
    expect(page).not.toContain('style=')
    expect(page).not.toContain('NaN')
  })

  test('the ruler counts the room of all its parts and shows the letter that halved it', () => {
    const drawn = renderToStaticMarkup(
      <Ruler units={90} perPart={67} segments={2} encoding="UCS-2" offending={['ç']} />,
    )
    expect(drawn).toContain('90 of 134 · 2 parts')
    expect(drawn).toMatch(/<mark[^>]*>ç<\/mark>/)
  })

  test('the chart names days in the zone of the area', () => {
    // Half past three in the night UTC is still the evening before in Bogota.
    const at = Date.UTC(2026, 2, 3, 3, 30)
    const words = renderToStaticMarkup(
      <FlowChart
        points={[{ at, litresPerHour: 5 }]}
        needLitresPerHour={4}
        forecast={{ kind: 'holds' }}
        forecastWords="It holds."
        timeZone="America/Bogota"
      />,
    )
    expect(words).toContain('2 Mar')
    expect(words).not.toContain('3 Mar')
  })
})
