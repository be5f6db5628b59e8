import type { Language } from '@/lib/domain/language'

/** How invented families put things, as people text: short, without accents, not always the same. */
export type Voice = {
  done: readonly string[]
  slow: readonly string[]
  noFlow: readonly string[]
  minutes: (minutes: number) => readonly string[]
  unwell: readonly string[]
  broken: readonly string[]
  unsure: readonly string[]
  wrongNumber: readonly string[]
}

export const voices: Record<Language, Voice> = {
  en: {
    done: ['done', 'DONE', 'Done thanks', 'we washed it'],
    slow: ['slow', 'still slow', 'water comes very slow', 'low flow'],
    noFlow: ['no water comes out', 'nothing comes'],
    minutes: (m) => [`${m}`, `${m} min`, `about ${m} min`, `${m} minutes`],
    unwell: ['my son has diarrhoea', 'the baby is sick and vomiting'],
    broken: ['it fell and now water comes out the side', 'the cap is cracked'],
    unsure: ['it stop', 'what about tuesday', 'the man said ask you'],
    wrongNumber: ['wrong number'],
  },
  es: {
    done: ['listo', 'ya lo lave', 'hecho', 'Listo gracias'],
    slow: ['sale poca agua', 'esta lento', 'sale muy despacio', 'lento'],
    noFlow: ['no sale nada de agua', 'no sale agua'],
    minutes: (m) => [`${m}`, `${m} min`, `${m} minutos`, `como ${m} min`],
    unwell: ['mi hijo tiene diarrea', 'mi nina esta enferma con vomito'],
    broken: ['se rompio la tapa', 'se cayo y esta rajado'],
    unsure: ['se paro', 'y el martes?', 'dice mi suegra que no'],
    wrongNumber: ['numero equivocado'],
  },
  fr: {
    done: ['fait', "c'est fait", 'Fini merci'],
    slow: ["l'eau coule lentement", 'lent', 'ca coule tres doucement'],
    noFlow: ["il n'y a pas d'eau", 'rien ne coule'],
    minutes: (m) => [`${m}`, `${m} min`, `${m}mn`, `environ ${m} minutes`],
    unwell: ['mon fils a la diarrhee', 'le bebe est malade'],
    broken: ['le bouchon est casse', 'il est tombe et il fuit'],
    unsure: ["ca s'arrete", 'et mardi ?'],
    wrongNumber: ['mauvais numero'],
  },
  bn: {
    done: ['শেষ', 'হয়েছে', 'dhoya sesh'],
    slow: ['পানি ধীরে আসে', 'ধীর', 'pani aste ase'],
    noFlow: ['পানি আসে না', 'pani ase na'],
    minutes: (m) => [`${m}`, `${m} মিনিট`, `${m} minit`],
    unwell: ['ছেলের ডায়রিয়া হয়েছে', 'amar meye osustho'],
    broken: ['ঢাকনা ভেঙে গেছে', 'pore fete geche'],
    unsure: ['মঙ্গলবার কি?', 'apni ke'],
    wrongNumber: ['ভুল নম্বর', 'vul number'],
  },
}
