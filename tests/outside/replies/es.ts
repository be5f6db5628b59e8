import { esTroubleReplies } from './es-trouble'
import { labelled, type LabelledReply } from './reply-set'

/** Spanish replies, labelled by hand for the tests; every kind, with the hard ones. */
export const esReplies: LabelledReply[] = [
  ...esTroubleReplies,
  ...labelled('es', [
    [
      'wash',
      'done',
      `
      listo | Listo | LISTO | listo! | listo ya | ya listo | hecho | ya | ya está | ya esta listo | ya lo hice | lo hice | ya lo lavé | lo lave | lave el filtro | ya lavamos | lavado | ya lavado | lo limpié | ya limpie | limpiamos ayer | terminé | terminado | termine ya |
      ok listo | si listo | si ya | si ya lo hice | listo gracias | hola ya lo lave | listo señora | lisot | litso | echo | ya quedo | ya qedo | ya lo ise | ayer lo lave | recién lo lavé | esta mañana lo lavamos`,
    ],
    [
      'change',
      'done',
      `cambiado | ya lo cambié | cambie el cartucho | cambiamos | ya puse el nuevo | puse la nueva | lo reemplacé | ya se cambio | listo el cambio`,
    ],
    [
      'step',
      'done',
      `
      ya mejoro | mejor | ya esta mejor | mucho mejor | ya sale bien | sale bien | ahora sale bien | ya sale agua | ya se arreglo | arreglado | ya no está lento | ya funciona | sale mas rapido | sale como antes | estaba lento pero ya sale bien | enderece la manguera | llene el balde`,
    ],
    [
      'wash',
      'not-yet',
      `
      todavía no | todavia no | aun no | aún no | no todavia | mañana | manana | mñana | mañana lo hago | mas tarde | más tarde | luego | despues | después lo lavo | al rato | en la noche | esta tarde | el domingo | se me olvidó | me olvide | olvide | no lo he lavado |
      no he lavado | no lo lave | no lo hice | no lo he hecho | no he podido | no pude | no tengo tiempo | no tuve tiempo | estoy ocupada | ocupado | estoy trabajando | cuando llegue a casa | la proxima semana | lo voy a lavar | voy a lavarlo mañana | ahorita no | estoy en el campo |
      no estoy en casa | todavia no pero gracias | no gracias todavia no | ya lo voy a hacer | en 10 minutos | lo lavare mañana | aun no lo he lavado | todabia no`,
    ],
    [
      'change',
      'not-yet',
      `no lo he cambiado | todavia no lo cambio | lo cambio el sabado | voy a cambiarlo`,
    ],
    [
      'none',
      'need-part',
      `
      necesito una tapa | necesito otra tapa | necesitamos un cartucho | mandeme una manguera | me manda una jeringa por favor | necesito un filtro nuevo | perdimos la jeringa | se perdio la jeringa | no encuentro la jeringa | no tengo jeringa | no tenemos jeringa | sin jeringa |
      se acabo el carbon | hace falta la tela | me falta la tapa | me pueden dar otra llave | quiero un cartucho nuevo | donde consigo la jeringa? | ocupo repuesto | nos robaron la manguera | traiganme una tapa nueva | nesecito jeringa | se me perdio la tapa | pueden mandar otra manguera`,
    ],
    [
      'none',
      'ask',
      `
      como lo lavo? | como se lava | cómo se limpia el filtro? | cuantas veces le doy con la jeringa? | cuando cambio la tela? | cuando vienen? | cuándo van a venir | se puede tomar el agua? | puedo tomarla? | que hago? | que debo hacer | no entiendo | no entendi | que quiere decir eso | por que? |
      para que sirve la jeringa? | se lava con agua caliente? | hay que hervir el agua? | cuanto tiempo espero? | una pregunta | puedo usar jabon? | cuanto cuesta? | es normal? | no se como se hace | quien va a venir? | cada cuanto se lava? | q hago | es bueno para el bebe?`,
    ],
    [
      'none',
      'thanks',
      `gracias | muchas gracias | mil gracias | grasias | gracias señora | dios los bendiga | dios le pague | ok gracias | gracias por el filtro | muy amable | bendiciones | se agradece | gracias! | 🙏 | grax | gracias a ustedes`,
    ],
    [
      'step',
      'yes',
      `si | sí | Si | SI | sii | si señora | claro | claro que si | ok | okay | vale | dale | bueno | esta bien | correcto | así es | 👍 | de acuerdo | sip | si gracias | simon`,
    ],
    [
      'step',
      'no',
      `no | No | NO | nop | no señora | no para nada | nel | no está rajado | no está roto | no hay fuga | no gotea por ningun lado | sin grietas | no se cayo | nadie esta enfermo | no tiene mal olor`,
    ],
    [
      'step',
      'choice',
      `1 => 1 | 2 => 2 | 3 => 3 | 1. => 1 | #2 => 2 | uno => 1 | dos => 2 | tres => 3 | 1 gracias => 1 | el 2 => 2`,
    ],
    [
      'none',
      'stop',
      `
      STOP | alto | ALTO | parar | pare | paren | basta | ya basta | no mas | no más | no mas mensajes | ya no | ya no mas | cancelar | stop por favor | baja | quiero darme de baja | darme de baja | dar de baja | desuscribir | no me escriban | no me escriban más | no me escriba mas por favor |
      ya no me escriban | dejen de escribirme | deje de mandar mensajes | dejen de molestar | no manden mas mensajes | no me manden mensajes | no quiero mensajes | no quiero mas mensajes | ya no quiero mensajes | no quiero recibir mensajes | no deseo recibir mas mensajes | no me molesten |
      dejenme en paz | déjeme en paz | borren mi numero | quiten mi numero | saquenme de la lista | elimine mi numero | no envien mas | ya no me manden nada | por favor no me escriban | basta de mensajes | paren los mensajes | no me interesa | unsubscribe | no mas por favor | dont text me | ya paren de escribir | ya no molesten`,
    ],
    [
      'none',
      'wrong-number',
      `
      número equivocado | numero equivocado | numero ekivocado | equivocado | está equivocado | se equivoco de numero | se equivocaron | te equivocaste de numero | no soy maria | yo no soy juan | no soy esa persona | no es mi numero | no conozco a esa persona | no la conozco |
      este numero ya no es de ella | es otra persona | numero incorrecto | que filtro? numero equivocado | aqui no vive esa señora | yo no tengo ningun filtro, equivocado | wrong number | persona equivocada | compre este chip hace poco | creo que se equivocó`,
    ],
    [
      'none',
      'moved',
      `nos mudamos | me mudé | me mude a otro pueblo | ya no vivo ahi | ya no vivimos alli | nos cambiamos de casa | cambie de casa | vivimos en otro lugar | nos fuimos a vivir a la ciudad | nueva direccion`,
    ],
    [
      'none',
      'help',
      `ayuda | AYUDA | ayudenme | necesito ayuda | auxilio | help | me pueden ayudar`,
    ],
    ['none', 'start', `start | empezar de nuevo | iniciar | quiero recibir mensajes de nuevo`],
    [
      'wash',
      'unclear',
      `se paró | se detuvo | paró | no funciona | no sirve | dejo de gotear | jajaja | hola | buenos dias | asdf | llameme | ? | mi vaca esta en el corral | el bus para en el mercado | quien es?`,
    ],
  ] as const),
]
