import type { Moment } from '@/lib/domain/moments'

const stage =
  '{stage, select, 1 {cloth (1 notch)} 2 {carbon (2 notches)} 3 {long stage (3 notches)} 12 {cloth (1 notch) and carbon (2 notches)} 13 {cloth (1 notch) and long stage (3 notches)} 23 {carbon (2 notches) and long stage (3 notches)} 123 {all stages} other {stage}}'
const thenTime = 'Then time 1 litre. Text us the minutes.'

/** First edition in English, the programme's first language. */
export const en: readonly { moment: Moment; body: string }[] = [
  {
    moment: 'welcome',
    body: 'This is {programme}, about your water filter. We text when it needs care. Answer in your own words. To end the texts, send STOP.',
  },
  {
    moment: 'first-flush',
    body: 'Your new filter must run clear first. Flush 1 litre and pour it away. Then time the next litre. Text us the minutes.',
  },
  {
    moment: 'wash-due',
    body: '{house}: time to wash the long stage (3 notches). Push clean water back, 10 strokes each end. Washed? Text DONE. Still slow? Text SLOW.',
  },
  {
    moment: 'wash-nudge',
    body: '{house}: the filter still waits for its wash. Washed? Text DONE. No time yet? Text LATER. Water slow? Text SLOW.',
  },
  {
    moment: 'change-due',
    body: `{house}: time to change the ${stage}. Changed? Text DONE. No new one at home? Text NEED PART.`,
  },
  {
    moment: 'change-nudge',
    body: `{house}: the ${stage} still needs changing. Changed? Text DONE. No new one at home? Text NEED PART.`,
  },
  {
    moment: 'flow-check',
    body: '{house}: how well does your filter run? Fill a 1 litre bottle from it. Text us the minutes. A number is enough.',
  },
  {
    moment: 'ask-flow',
    body: 'Thank you. How many minutes to fill 1 litre? Text just the number. Nothing comes at all? Text NO WATER.',
  },
  {
    moment: 'step-wash-fibre',
    body: `Please wash the long stage (3 notches). Push clean water back, 10 strokes each end. ${thenTime}`,
  },
  {
    moment: 'step-rinse-cloth',
    body: `Please open the top cap. Rinse the cloth in clean water. Put it back. ${thenTime}`,
  },
  {
    moment: 'step-flush-carbon',
    body: `Please take off the carbon stage (2 notches). Flush it with 1 litre. Put it back. ${thenTime}`,
  },
  {
    moment: 'step-bleed-air',
    body: `Please let the air out of the hose. Hold its end low and tap it. Wait until no bubbles come. ${thenTime}`,
  },
  {
    moment: 'step-straighten-hose',
    body: `Please straighten the hose. Nothing may bend or press it. ${thenTime}`,
  },
  {
    moment: 'step-fill-container',
    body: `Please fill the top container to the brim. High water pushes harder. ${thenTime}`,
  },
  {
    moment: 'step-refit-cap',
    body: `Please take the caps off. Fit them again, straight and firm. ${thenTime}`,
  },
  {
    moment: 'step-look-hose',
    body: 'Please look along the hose. Is it bent or pressed? Text 1. Bubbles in it? Text 2. Neither? Text 3.',
  },
  {
    moment: 'step-check-cracks',
    body: 'Please look at the filter closely. A crack or a leak? Text 1. Did it fall or freeze? Text 2. None of these? Text 3.',
  },
  {
    moment: 'got-it',
    body: 'Thank you, we have your text. Someone from {programme} will write to you.',
  },
  {
    moment: 'flowing',
    body: 'Good news: your filter runs well again. Thank you for your care. We write when the next wash is due.',
  },
  {
    moment: 'ask-again',
    body: 'Thank you. Please time 1 litre once more. Use the same bottle. Text us the minutes.',
  },
  {
    moment: 'part-owed',
    body: `Your filter needs a new ${stage}. {programme} will get one for you. We text when it is ready.`,
  },
  {
    moment: 'part-ready',
    body: `Your new ${stage} is ready. Please collect it at {depot}. When it is in place, text DONE.`,
  },
  {
    moment: 'visit-booked',
    body: 'Someone from {programme} will visit you on {visitOn}. Not a good day? Text us a better one.',
  },
  {
    moment: 'stop-using',
    body: 'Do not drink from the filter for now. It may be damaged. {programme} will write to you soon.',
  },
  {
    moment: 'drink-advice',
    body: 'Boil your drinking water. It must bubble hard for {minutes} min. Let it cool under a lid. Keep children away, it burns. Boiling does not remove fuel or chemicals. If it smells of those, find other water.',
  },
  {
    moment: 'unwell',
    body: 'We are sorry to hear this. Please go to a health worker today. If it gets worse, go at once. {programme} cannot give medical advice.',
  },
  {
    moment: 'unwell-now',
    body: 'Please go to a health worker NOW. Do not wait for our answer. {programme} cannot give medical advice.',
  },
  { moment: 'thanks', body: 'Thank you. We write when your filter needs care again.' },
  {
    moment: 'unclear',
    body: 'Thank you. A person at {programme} will read your text. You may also say it in other words.',
  },
  {
    moment: 'stop-or-stopped',
    body: 'Has the water stopped? Text NO WATER. No more texts from us? Text STOP.',
  },
  {
    moment: 'stopped',
    body: '{programme}: you will get no more texts from us. To get them again, text START.',
  },
  {
    moment: 'started',
    body: '{programme}: you will get our texts again. To end them, text STOP.',
  },
  {
    moment: 'help',
    body: '{programme} helps keep your water filter running. Text us any trouble in your own words. To end the texts, send STOP.',
  },
  {
    moment: 'wrong-number',
    body: 'Sorry for the trouble. We will not text this number again.',
  },
]
