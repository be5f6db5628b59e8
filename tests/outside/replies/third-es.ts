import { labelled } from './reply-set'

/** A third Spanish batch, written after the second was mended. */
export const thirdEsReplies = labelled('es', [
  [
    'wash',
    'slow',
    `Sale nomas un hilito | el agua cae gotita por gotita | en la noche estaba lleno y amaneció con dos vasos nomas | después de lavar mejoró un día y ahora otra vez lento | está medio lento la verdad | sale muy poquito | ha bajado mucho el flujo ayuda | por qué se puso tan lento | el agua va lenta lentaa | hay que esperar horas para un vaso | poca presión desde que empezó la lluvia | ya no es rápido como antes | tarda bastante`,
  ],
  [
    'wash',
    'no-flow',
    `no sale aguaa | no nos da agua | el filtro no pasa agua | el agua no quiere bajar | dejó de pasar agua por completo | no hay flujo para nada | la llave abierta y no cae nada | está tapada la manguera no sale | cero agua hoy | se secó, nada sale`,
  ],
  [
    'flow',
    'flow-figure',
    `Creo que 18 min => 18 | más o menos 25 => 25 | tres minutos treinta segundos => 3.5 | 1hr 5min => 65 | ocupa 33 minutos => 33 | 9'20 => 9.3333 | un cuarto de hora => 15 | tardó 26 mins hoy => 26 | cincuenta => 50 | 14 minutos la botella, gracias => 14 | veinte y dos => 22 | medio minuto => 0.5 | 12 con 30 segundos => 12.5`,
  ],
  [
    'wash',
    'broken',
    `La carcasa tiene una grieta grande | el plástico está rajado del cuello | mi filtro se quebró | hay un hoyo en el fondo del balde de arriba | se sale muchísimo | gotea donde se une la manguera | se escapa agua por la tapa | lo agarró la helada anoche, puro hielo adentro | los niños lo dejaron caer por las gradas | se cayó de la mesa | la manguera está rota | sale el agua con demasiada fuerza como sin filtro | hoy salió demasiado rápido | una rata hizo un hueco en el tubo | se quebró la llave, y ahora`,
  ],
  [
    'change',
    'odd-water',
    `el color del agua no es normal | esta cafecita | viene con tierra el agua | vemos gusanitos | cambió el sabor, está amarga | el olor es terrible | olor a químicos en el agua | hay una capa de aceite encima | sale polvo negro | hoy no está clara el agua | sigue turbia aun después de lavar | sabe a plástico | hay arena en mi vaso | apesta a cloro`,
  ],
  [
    'none',
    'unwell',
    `mi bebé anda mal de la pancita | lleva 3 días con diarrea | los dos nos sentimos mal después de tomarla | mi hija vomitó dos veces | el niño tiene dolor de barriga | hoy le empezó la fiebre | tengo retorcijones y diarea | mi niño se siente enfermo | mi esposa anda mala desde el martes | a nuestro hijo le dio cólera | está vomitando | los gemelos andan otra vez sueltos del estómago | náuseas cada mañana | será el agua lo que enferma a mi hijo? | a mi esposo lo llevaron al hospital`,
  ],
  [
    'none',
    'unwell',
    `mi bebé no está tomando nada† | la niña no quiere beber y está muy débil† | está inconsciente ayuda por favor† | popó con sangre desde ayer† | vomita todo y está muy dormido† | mi hijo tiene convulsiones seguido† | no despierta bien† | el bebé no ha mamado en todo el día y está flojito†`,
  ],
  [
    'none',
    'stop',
    `no más sms por favor | por favor quítenme | ya párenle | no quiero que me escriban | dejen de mandar esto | pueden dejar de mandar mensajes a mi celular | quiten mi nombre | no me molesten otra vez | por favor cancelen estos mensajes | estoy cansado de sus mensajes | déjenme en paz por favor | ya basta de esto`,
  ],
  [
    'none',
    'wrong-number',
    `Número equivocado por favor | está escribiendo a un número equivocado | este número no es de Graciela | no soy esa persona | yo no, número equivocado | no tengo idea quién es usted, equivocado | esta no es la familia Mamani | compré este chip la semana pasada`,
  ],
  [
    'wash',
    'done',
    `lavado hecho | ya está limpio, lo lavé | hicimos el lavado | terminé la limpieza | sí ya lo lavé señor | listo ✅ | listooo | lo lavé ayer en la tarde | limpio y funcionando`,
  ],
  [
    'wash',
    'not-yet',
    `perdón todavía no | mañana lo lavo | este fin de semana lo limpio | no he encontrado tiempo | más tarde hoy | ando de viaje, la otra semana | aún sin lavar | mi jeringa está donde mi hermana, mañana | pienso hacerlo el domingo | se me olvidó otra vez jaja`,
  ],
  [
    'none',
    'need-part',
    `por favor necesito otra llave | la tela se rompió, necesito otra | será posible conseguir otra jeringa? | ya no hay carbón, traigan por favor | necesito un cartucho de repuesto | queremos una manguera nueva | se perdió mi tapa`,
  ],
  [
    'none',
    'ask',
    `cómo sé que está limpio? | cuándo es la próxima visita | cuál es el precio | podemos usar agua de lluvia? | cómo se abre | por qué pregunta | a quién llamo | cuándo debo cambiar la tela`,
  ],
  [
    'none',
    'thanks',
    `Gracias a Dios y a ustedes | gracias mi amor | ok gracias | grasias | se lo agradezco`,
  ],
  ['step', 'yes', `sí señor | sí creo que sí | sí está | bueno ya | correcto`],
  ['step', 'no', `no señor no está | nop | ninguna grieta | no gotea | para nada`],
  ['step', 'choice', `1 => 1 | opción 2 => 2 | numero 3 => 3 | 2 por favor => 2`],
  ['wash', 'unclear', `se perdió mi chivo | hoy llueve | jaja | el bus se paró | ok?`],
])
