import { labelled } from './reply-set'

/** A second Spanish batch, written after the reader passed the first, as other people would text. */
export const freshEsReplies = labelled('es', [
  [
    'wash',
    'slow',
    `
    buenas señorita fijese que el agua viene bien poquita desde el lunes | wey sale re lento | ya le di con la jeringa como dijeron pero el chorrito sigue delgado | casi ni cae | nos toca esperar toda la noche para una olla | antes llenaba rapido ahora ni se mueve casi | media jarra en toda la noche | ta muy lenta la bajada del agua |
    pues ya lo lave y todo pero la verdad sigue bien despacito no se por que | el agüita cae de a poquito | no da abasto para los niños | se demora un monton | va lentisimo | sale bien flojita | ya lo hice dos veces y nada que mejora`,
  ],
  [
    'wash',
    'no-flow',
    `no le sale nada | desde la mañana no ha salido ni una gotita | echo agua arriba y abajo no cae nada | la llave abierta y nada | totalmente tapado | ya dejo de dar agua | hace 2 dias que no da agua | el agua se queda arriba y no baja | no quiere salir el agua | seco totalmente, ni gota`,
  ],
  [
    'flow',
    'flow-figure',
    `
    tipo 9 minutos => 9 | nos tardo once minutos => 11 | conté 14 => 14 | 13 mas o menos => 13 | empece 10:00 y termine 10:20 o sea 20 minutos => 20 | casi media hora => 30 | el reloj marca 8:45 => 8.75 | seis y medio => 6.5 | una hora y 10 minutos => 70 | Buenos días. Tardó 17 minutos. Gracias. => 17 | 2min 15seg => 2.25 |
    aprox 22 min por litro => 22 | quince minutos o algo asi => 15 | 40 segundos => 0.6667 | cuarenta minutos!! => 40 | como 1 hr => 60 | 19 mins => 19 | me dio 6 => 6 | 7,5 => 7.5 | veintidos minutos => 22`,
  ],
  [
    'wash',
    'broken',
    `
    mi nieto lo boto de la repisa | la tuerca de plastico se partió en dos | le gotea por la union de abajo | lo dejamos afuera y amanecio hecho hielo | el fondo del balde se abrio y se riega | la llave no cierra y se tira toda el agua | el perro le mordió al tubo | se sale el agua por debajo | alguien se sento encima y se doblo | se me desarmó en las manos |
    parece que tiene una rajadita en la carcasa | se zafó la manguera y mojo todo el piso | esta mojado alrededor creo que tiene fuga | ahora pasa volando el agua, mucho mas rapido que lo normal | se me resbaló y cayo al cemento`,
  ],
  [
    'change',
    'odd-water',
    `el agua cambio de color | parece te aguado | flotan puntitos negros | sabe como a moneda | dice mi esposa que el agua huele a perro mojado | los niños no la quieren tomar porque apesta | trae olor como a gasolina | medio verdosa | hay unos animalitos nadando en el vaso | se puso turbia | sabe a jabon | sale un tufo feo de la jarra | viene amarillita y huele`,
  ],
  [
    'none',
    'unwell',
    `
    el bebe ha estado toda la noche con el estomago suelto | mi abuelo tiene mucha temperatura y escalofrios | mi niño esta ardiendo en fiebre | lleva vomitando desde anoche | todos en la casa andamos mal de la panza | a mi esposa le dio colera dicen | el chamaco anda con chorrillo | me siento muy mal, puros colicos | mi hermana hace del baño como agua | fuimos a la clinica por problemas del estomago |
    dos de mis hijos se enfermaron esta semana | mi hijo no anda bien de salud | ya lave el filtro pero al mas chiquito le pego la diarrea | se la pasa en el baño con dolor de barriga`,
  ],
  [
    'none',
    'unwell',
    `el bebe no quiere agarrar el pecho desde la mañana† | mi niña nomas esta acostada y no me contesta† | esta tan debil que no puede tomar agua† | hizo popo con sangre† | empezo a temblar y se le fueron los ojos† | no lo podemos despertar† | todo lo que traga lo devuelve† | mi hija se desmayó† | el recien nacido dejo de mamar† | tiene calentura y tanto sueño que ni se sienta†`,
  ],
  [
    'none',
    'stop',
    `
    por favor ya no me manden esto | ya estuvo bueno de mensajes | ya no deseo recibir estos mensajes | saquenme de esta lista por favor | ya no escriban a este celular | borren mi num | no kiero q me escriban mas | ya dejen de fregar con los mensajes | DENME DE BAJA | no vuelvan a mandar mensajes a este numero | alto!!!! | les pido que no me escriban | ya me cansaron sus mensajes basta | terminen con los mensajes por favor | no me escribas otra vez`,
  ],
  [
    'none',
    'wrong-number',
    `disculpe tiene el numero equivocado | hola yo no soy patricia | aqui no vive ninguna amina | creo que confundieron los numeros | este telefono ahora es de otra persona | no se de ningun filtro, numero equivocado | le escribio al telefono equivocado | No soy la señora Quispe | se equivoco de persona | quien es? no conozco ningun programa de agua, equivocado`,
  ],
  [
    'wash',
    'done',
    `todo listo | sip ya lo termine en la mañana | lavado y armado otra vez | Ya lo limpié, gracias | trabajo hecho | ayer en la tarde lo hice | ya esta lavado | cumplido señorita | mi hija me lo limpio | ya qdo listo`,
  ],
  [
    'wash',
    'not-yet',
    `no me ha dado tiempo | mañana si dios quiere | el fin de semana lo hago | he andado muy ocupado, perdon | no he tenido chance | lo hago cuando deje de llover | todavia no lo hago, me lastime la mano, mañana | recuerdeme la otra semana por favor | en la noche cuando llegue mi hijo | iba a hacerlo pero se me olvido`,
  ],
  [
    'none',
    'need-part',
    `podrian traer otra jeringa | se perdio el empaque necesito uno nuevo | ya no tenemos telas del filtro | donde consigo otra manguera? | mi jeringa se extravio | no aparece la tapa | solicito el carbon nuevo | no tenemos el repuesto`,
  ],
  [
    'none',
    'ask',
    `cada cuanto hay que limpiarlo | primero hay que hervir el agua? | a que hora viene el señor | le puedo dar al bebe? | cual lado va para arriba | lo puedo dejar al sol? | que significa retrolavado | ustedes arreglan baldes tambien? | me lo explica otra vez por favor | por que tengo que hacerlo cada dos semanas?`,
  ],
  [
    'none',
    'thanks',
    `muchisimas gracias por su ayuda | Dios los bendiga a todos | se les agradece mucho | gracias mil | muy agradecida señor`,
  ],
  ['step', 'yes', `si asi es | sip | claro que sí | ok ya entendi | sí señorita | eso mismo si`],
  ['step', 'no', `no, no es | para nada | no veo ninguna grieta | negativo | no nada de eso`],
  [
    'step',
    'done',
    `ya corre bien otra vez | uy ahora si mucho mejor | ya esta saliendo bonito | ya quedo arreglado | ya funciona gracias a Dios`,
  ],
  [
    'none',
    'moved',
    `nos fuimos a vivir al otro pueblo | ya no estamos en esa casa, nos mudamos | me pase a la casa de mi hermano | mi familia se cambio de casa`,
  ],
  ['wash', 'unclear', `nomas se paró | se detuvo solo | la bomba se paro | que dia | nos vemos`],
])
