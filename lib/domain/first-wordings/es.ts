import type { Moment } from '@/lib/domain/moments'

/*
 * First edition in Spanish: a draft for a native speaker to check. Words with á, í, ó or ú are
 * avoided: a phone's basic alphabet lacks them, and one of them halves the room of a text.
 */

const stage =
  '{stage, select, 1 {la tela (1 muesca)} 2 {la etapa negra (2 muescas)} 3 {la etapa larga (3 muescas)} 12 {la tela (1 muesca) y la etapa negra (2 muescas)} 13 {la tela (1 muesca) y la etapa larga (3 muescas)} 23 {la etapa negra (2 muescas) y la etapa larga (3 muescas)} 123 {las 3 etapas} other {la etapa}}'
const thenTime = 'Luego mida el tiempo de 1 litro. Escriba los minutos.'

export const es: readonly { moment: Moment; body: string }[] = [
  {
    moment: 'welcome',
    body: 'Somos {programme}, sobre su filtro de agua. Le avisamos cuando necesita cuidado. Responda con sus palabras. Para no recibir textos, mande STOP.',
  },
  {
    moment: 'first-flush',
    body: 'El filtro nuevo debe correr claro primero. Deje correr 1 litro y no lo tome. Luego mida el tiempo del siguiente litro. Escriba los minutos.',
  },
  {
    moment: 'wash-due',
    body: '{house}: toca lavar la etapa larga (3 muescas). Empuje agua limpia, 10 veces por cada lado. ¿Ya? Escriba LISTO. ¿Sigue lento? Escriba LENTO.',
  },
  {
    moment: 'wash-nudge',
    body: '{house}: falta lavar el filtro. ¿Ya? Escriba LISTO. ¿No hay tiempo? Escriba LUEGO. ¿Sale poca agua? Escriba LENTO.',
  },
  {
    moment: 'change-due',
    body: `{house}: toca cambiar ${stage}. ¿Ya? Escriba LISTO. ¿No tiene repuesto? Escriba NECESITO PIEZA.`,
  },
  {
    moment: 'change-nudge',
    body: `{house}: falta cambiar ${stage}. ¿Ya? Escriba LISTO. ¿No tiene repuesto? Escriba NECESITO PIEZA.`,
  },
  {
    moment: 'flow-check',
    body: '{house}: queremos saber si el filtro corre bien. Llene una botella de 1 litro. Escriba los minutos. Basta la cifra.',
  },
  {
    moment: 'ask-flow',
    body: 'Gracias. ¿En qué tiempo se llena 1 litro? Escriba solo los minutos. ¿No sale nada? Escriba NO SALE AGUA.',
  },
  {
    moment: 'step-wash-fibre',
    body: `Por favor lave la etapa larga (3 muescas). Empuje agua limpia, 10 veces por cada lado. ${thenTime}`,
  },
  {
    moment: 'step-rinse-cloth',
    body: `Por favor abra la tapa de arriba. Enjuague la tela con agua limpia. Ponga la tela otra vez. ${thenTime}`,
  },
  {
    moment: 'step-flush-carbon',
    body: `Por favor saque la etapa negra (2 muescas). Deje correr 1 litro por ella. Ponga la etapa otra vez. ${thenTime}`,
  },
  {
    moment: 'step-bleed-air',
    body: `Por favor saque el aire de la manguera. Baje la punta y dé golpecitos. Espere hasta no ver burbujas. ${thenTime}`,
  },
  {
    moment: 'step-straighten-hose',
    body: `Por favor enderece la manguera. Nada debe doblar ni apretar la manguera. ${thenTime}`,
  },
  {
    moment: 'step-fill-container',
    body: `Por favor llene el recipiente de arriba hasta el borde. El agua alta empuja con fuerza. ${thenTime}`,
  },
  {
    moment: 'step-refit-cap',
    body: `Por favor quite las tapas. Ponga las dos otra vez, rectas y firmes. ${thenTime}`,
  },
  {
    moment: 'step-look-hose',
    body: 'Por favor mire toda la manguera. ¿Doblada o apretada? Escriba 1. ¿Tiene burbujas? Escriba 2. ¿Nada de eso? Escriba 3.',
  },
  {
    moment: 'step-check-cracks',
    body: 'Por favor mire bien el filtro. ¿Hay grieta o fuga? Escriba 1. ¿Se ha golpeado o congelado? Escriba 2. ¿Nada de eso? Escriba 3.',
  },
  {
    moment: 'got-it',
    body: 'Gracias, tenemos su mensaje. Alguien de {programme} le va a escribir.',
  },
  {
    moment: 'flowing',
    body: 'Buena noticia: su filtro corre bien otra vez. Gracias por el cuidado. Le avisamos cuando toque lavar.',
  },
  {
    moment: 'ask-again',
    body: 'Gracias. Por favor mida 1 litro otra vez. Use la misma botella. Escriba los minutos.',
  },
  {
    moment: 'part-owed',
    body: `Hay que renovar ${stage}. {programme} le consigue una nueva. Le avisamos cuando llegue.`,
  },
  {
    moment: 'part-ready',
    body: `Ya tenemos ${stage}. Por favor recoja la pieza en {depot}. Cuando la tenga puesta, escriba LISTO.`,
  },
  {
    moment: 'visit-booked',
    body: 'Alguien de {programme} le visita el {visitOn}. ¿No puede esa fecha? Escriba otra.',
  },
  {
    moment: 'stop-using',
    body: 'Por ahora no tome agua del filtro. Puede tener un defecto. {programme} le va a escribir pronto.',
  },
  {
    moment: 'drink-advice',
    body: 'Hierva el agua de beber. Debe burbujear fuerte {minutes} min. Deje enfriar con tapa. Lejos de los niños, porque quema. Hervir no quita gasolina ni veneno. Si huele a eso, busque otra agua.',
  },
  {
    moment: 'unwell',
    body: 'Lo sentimos mucho. Por favor vaya hoy al centro de salud. Si empeora, vaya de inmediato. {programme} no puede dar consejo médico.',
  },
  {
    moment: 'unwell-now',
    body: 'Por favor vaya YA al centro de salud. No espere nuestra respuesta. {programme} no puede dar consejo médico.',
  },
  { moment: 'thanks', body: 'Gracias. Le avisamos cuando el filtro necesite cuidado otra vez.' },
  {
    moment: 'unclear',
    body: 'Gracias. Una persona de {programme} va a leer su mensaje. También puede escribir con otras palabras.',
  },
  {
    moment: 'stop-or-stopped',
    body: '¿Ya no sale agua? Escriba NO SALE AGUA. ¿No quiere recibir textos? Escriba STOP.',
  },
  {
    moment: 'stopped',
    body: '{programme}: ya no le mandamos textos. Para recibir textos otra vez, escriba START.',
  },
  {
    moment: 'started',
    body: '{programme}: le mandamos textos otra vez. Para no recibir textos, escriba STOP.',
  },
  {
    moment: 'help',
    body: '{programme} le ayuda a cuidar su filtro de agua. Escriba el problema con sus palabras. Para no recibir textos, mande STOP.',
  },
  {
    moment: 'wrong-number',
    body: 'Disculpe la molestia. Ya no escribimos a este celular.',
  },
]
