import { labelled } from './reply-set'
/** A fourth Spanish batch, written after the third was mended. */
export const fourthEsReplies = labelled('es', [
  [
    'wash',
    'slow',
    `bajó el chorro | sale despacito el agua | ni una taza por hora | bien lento hoy | se está poniendo lento | lento otra vez | chorro débil | no es suficiente agua | medio día por balde | puro goteo | como tortuga`,
  ],
  [
    'wash',
    'no-flow',
    `nada de agua | no baja | ni gotea | se paró, no sale agua | no pasa | creo que está tapado`,
  ],
  [
    'flow',
    'flow-figure',
    `12 mins aprox => 12 | 1 h 15 => 75 | dieciocho min => 18 | 3min => 3 | treinta y dos => 32 | 6:15 => 6.25 | 11 o 12 => 11.5 | 100 segundos => 1.6667 | 45 => 45 | son 9 => 9`,
  ],
  [
    'step',
    'broken',
    `sí tiene una grieta | rajadura al lado | si gotea por abajo | tiene un hueco | se cayó la semana pasada | sí se congeló | el tubo está partido`,
  ],
  [
    'step',
    'no',
    `sin rajaduras | no se ha caído | no se congeló | nada roto | no hay huecos | nunca se cayó`,
  ],
  [
    'wash',
    'broken',
    `se salió la tapa y se rompió | el filtro quedó destrozado | se rajó la tapa al abrir | sale agua por todos lados | el balde gotea por la llave | rata cortó la manguera | la helada lo rajó | el bebé lo aventó`,
  ],
  [
    'change',
    'odd-water',
    `agua gris | sabe a tierra | mal aroma | negra como tinta | olor a aceite | sabe a kerosene | gusano en el vaso | huele a podrido | espumosa | color óxido`,
  ],
  [
    'none',
    'unwell',
    `mi niño con dolor de panza | hay diarrea en la casa | mi mamá está vomitando | niño con calentura | nos enfermamos después de tomar | me duele mucho el estómago | churria desde el domingo | está internado en el hospital | disentería | el niño no está bien`,
  ],
  [
    'none',
    'unwell',
    `está inconsciente† | el niño no quiere beber† | vomitando todo† | sangre en la caca† | le dio convulsión† | bebé muy dormido no mama†`,
  ],
  [
    'none',
    'stop',
    `paren de escribir | no manden | quiero salirme | desuscribirme | no más textos | por favor no escriban | alto!!! | bórrenme de esto | cancelar | ya basta paren`,
  ],
  [
    'none',
    'wrong-number',
    `num equivocado | número equivocado amigo | no soy Fátima | este es el teléfono de Juan no de ella | se equivocó de persona | quién? equivocado`,
  ],
  [
    'wash',
    'done',
    `lavé | lavado esta mañana | Listo, sale bien | hice el lavado | ok lo hice | sí lavé | terminado ahora`,
  ],
  [
    'wash',
    'not-yet',
    `ahora no | lueguito | en la tardecita | voy a lavar | mañana temprano | sin tiempo aún | perdón ocupada | no lavé`,
  ],
  [
    'none',
    'need-part',
    `se perdió la tapa | necesito filtro | manden jeringa | falta la manguera | quiero tela nueva`,
  ],
  ['none', 'ask', `cómo? | cuándo cambio? | qué significa? | puedo beber? | dónde viven ustedes`],
  ['none', 'thanks', `grax | gracias señor | bendiciones | muchas gracias a todos | graciaaas`],
  [
    'none',
    'moved',
    `cambié de casa | ahora vivimos en el pueblo, nueva dirección | nos mudamos el mes pasado`,
  ],
  ['step', 'yes', `sí por favor | sip | está bien | sí es`],
])
