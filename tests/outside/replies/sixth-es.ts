import { labelled, type LabelledReply } from './reply-set'

/** A sixth batch, by an author who had seen neither the reader nor the older sets. */
export const sixthEsReplies: LabelledReply[] = labelled('es', [
  [
    'none',
    'slow',
    `Buenas tardes señorita, el filtro está muy despacioso, antes me alcanzaba para el almuerzo y ahora tengo que pedirle a la vecina |
      sale agüita pero con una flojera | el agua baja con mucha pereza desde q limpiaron el pozo |
      ocupo prenderlo desde la madrugada pa tener agua al mediodia`,
  ],
  [
    'wash',
    'done',
    `se me enfermó la vaca pero el filtro si lo lavé | ya lo lave y sale bien bonito | sip ya | Listo el pollo |
      el nene estuvo malo hace quince días, ya anda correteando. filtro lavado hoy | ia lo labe oi en la mañana`,
  ],
  [
    'step',
    'not-yet',
    `No he podido probarlo, el filtro está en casa de mi suegra y subo el domingo`,
  ],
  [
    'step',
    'broken',
    `la tapa buena, lo malo es la llave que escurre por fuera | sí, está rajadita |
      se barrió la tuerca y no cierra, escurre todo el dia`,
  ],
  ['flow', 'moved', `lo vendi, ya tenemos agua de la red`],
  [
    'none',
    'broken',
    `el perro se comió la manguerita | con el temblor se vino abajo la repisa con todo y filtro |
      se me zafó de las manos y pegó en la pila, quedó con una raya de arriba abajo |
      ahora sale a chorro de golpe, hasta ayer era tranquilo | heló fuerte acá en la puna y el filtro amaneció hecho un bloque`,
  ],
  ['step', 'yes', `aja | Sí señorita, así es | simón`],
  [
    'wash',
    'odd-water',
    `listo aunq me quedó con sabor a cloro, dos días ya | Después de lavarlo sale cafecita, como agua de panela`,
  ],
  [
    'step',
    'no',
    `le busqué con lámpara y no tiene ninguna rajadura | No, está enterita | pa nada | nel`,
  ],
  ['wash', 'thanks', `ok gracias x recordarme`],
  [
    'change',
    'broken',
    `venía golpeado en la caja el repuesto, adentro suena como maraca |
      Al desenroscar la vieja tronó y se le fue un diente a la rosca`,
  ],
  ['change', 'odd-water', `cambié la pieza y el agua sale blanquecina turbia`],
  [
    'wash',
    'slow',
    `Todos sanos gracias a Dios, lo único es que el filtro casi no da agua |
      disculpen, se me fue la luz y no vi el mensaje. Limpio ya está, rápido no | ya lo lave pero sigue saliendo poquita |
      apenas ayer lo lave i otra ves anda bien calmudo | ya le jale con la jeringa un montón y no agarra fuerza`,
  ],
  [
    'none',
    'ask',
    `y si nos vamos un mes, lo dejo mojado o lo seco |
      Muy estimados señores, reciban un cordial saludo de la familia Quispe. Desearíamos saber si es menester hervir el agua además de filtrarla. Quedo a la espera de su amable respuesta. |
      a partir de qué edad puede tomar el bebé agua del filtro?`,
  ],
  [
    'flow',
    'flow-figure',
    `2,5 => 2.5 | 50 segundos => 0.8333 | 6 min => 6 | el mes pasado eran 4 y ahora son 8 => 8 |
      lo puse 7:05 y se llenó a las 7:18 => 13 | dieciseis minutos le contó el muchacho => 16 | dos minutitos => 2 |
      cinco y medio => 5.5 | media hora => 30 | 100 segs => 1.6667 | 40' => 40 | minuto y medio => 1.5 |
      hora y cuarto, no le miento => 75 | ciete minutos => 7 | 3:20 => 3.3333 | lentisimo oiga, 25 minutos => 25 |
      Un cuarto de hora, lo vi en el reloj de la pared => 15`,
  ],
  [
    'none',
    'odd-water',
    `el agua sabe a fierro | tiene un tufo a cloaca que ni el perro se la toma | esta salada el agua filtrada |
      se hace lama verde en la llave y en los vasos | el arroz me sale amarillento cuando uso del filtro, con la de botella no`,
  ],
  ['wash', 'unclear', `se paró`],
  [
    'step',
    'odd-water',
    `nadie enfermo no se preocupe, pero el agua apesta a pantano desde la creciente |
      No hay grieta. Lo que sí es que flotan unas basuritas negras en el agua limpia`,
  ],
  [
    'change',
    'done',
    `Cambiado el martes en la tarde | quedó instalado, me ayudó mi nieto, Dios se lo pague`,
  ],
  [
    'flow',
    'slow',
    `Alcancé a rezar el rosario completo y no se llenaba | muchisimo rato, ni le se decir cuanto | no lo medi pero es un hilito nomas`,
  ],
  [
    'wash',
    'broken',
    `mi hija le echó agua hirviendo y el plastico quedó todo chueco |
      quedó limpio. ah y por abajo del balde hay charco todos los dias, de ahi mismo sale |
      la vela está desportillada de una orilla, la encontré así al lavarla |
      ya, pero vi como un pelo en la cerámica y no es pelo, es grieta`,
  ],
  ['none', 'thanks', `Dios los bendiga | muy amables 🙏`],
  ['step', 'no-flow', `abrí la llavecita y nada de nada | ni goteando ni corriendo, seco seco`],
  ['change', 'unclear', `ya no está`],
  ['none', 'wrong-number', `aqui no vive ninguna Lupita | quien es? yo no tengo ningun filtro`],
  ['wash', 'stop', `borrenme porfa este cel es del trabajo | ya no me manden mensajes`],
  [
    'change',
    'no-flow',
    `Puse la etapa nueva anoche y amaneció el de arriba rebalsando y el de abajo vacío`,
  ],
  ['wash', 'ask', `como se lava | le puedo echar cloro | mandeme el video otra vez xfa`],
  [
    'none',
    'unwell',
    `mi cuñada tiene la piel amarilla y orina oscuro como cola |
      nos cayó de la patada esa agua, tres en la casa con retortijones | mi niña anda con chorro desde ayer sera el agua |
      le dan ataques, se pone tieso y echa espuma el chamaco† |
      no le para nada en el estómago, toma suero y lo devuelve, toma caldo y lo devuelve† |
      mi guagua tiene la lengua seca y no puede tragar ni agüita† | la abuelita no despierta bien, le hablamos y no responde†`,
  ],
  [
    'wash',
    'unwell',
    `no habia contestado xq andaba en la posta con mi hijito deshidratado, ya vamos a lavar |
      ya quedo. mi suegra internada por una infeccion | el tierno ya no quiere mamar y está muy decaído, no he lavado nada† |
      estoy con paludismo mijo, cuando se me quite lo lavo | Hoy no voy a poder, amanecí con escalofríos y no me sostengo en pie`,
  ],
  ['wash', 'wrong-number', `no soy doña Carmen, se equivocó`],
  ['flow', 'stop', `No deseo recibir más avisos, muchas gracias`],
  [
    'none',
    'stop',
    `ALTO | quiten mi número de su lista por favor |
      gotea y gotea el bendito filtro pero ya dejen de escribirme que me gastan el plan`,
  ],
  [
    'flow',
    'broken',
    `antes 6 minutos, ahora ni medio minuto, de repente se puso como manguera de bombero`,
  ],
  [
    'none',
    'no-flow',
    `paren tantito con el recordatorio, primero ayúdenme: el filtro no suelta agua desde el domingo | se tapó del todo el filtro`,
  ],
  ['change', 'unwell', `quedó puesta. eso sí todos andamos malos de la panza`],
  ['wash', 'moved', `nos mudamos pal norte y el filtro quedó en el rancho con los nuevos`],
  [
    'step',
    'slow',
    `si lo destapé, salió lodo. corre mejor pero ni a la mitad de lo que era |
      sacudí la manguera como dijo y sube tantito y otra vez se apoca | sin rajadura. gotea como suero de hospital`,
  ],
  ['none', 'done', `el agua baja bien rápido y clarita, estamos contentos`],
  [
    'step',
    'unwell',
    `apretado ya. ¿es normal que a los gemelos les salgan ronchas y les duela la barriga? |
      no está quebrada. mi papá está obrando con sangre†`,
  ],
  [
    'wash',
    'not-yet',
    `ahorita q llegue | ando en el jale hasta el viernes, luego lo hago | todavia no, se cortó el agua en el barrio`,
  ],
  ['change', 'not-yet', `se me pasó, qué pena con ustedes, lo hago en la noche | mañana sin falta`],
  [
    'flow',
    'unwell',
    `nadie midió, es que el más chiquito está suelto | once minutos. mi marido amaneció con calentura y basca`,
  ],
  ['step', 'ask', `eso de la válvula cuál es, la negrita?`],
  [
    'wash',
    'no-flow',
    `si lo lave y ya no quiere soltar nada el condenado | lo lave y quedó trancado, no pasa nada`,
  ],
  ['change', 'wrong-number', `Habla a una ferretería joven, aquí nadie pidió eso`],
  ['flow', 'odd-water', `4 min y hay unos animalitos que brincan en la botella`],
  ['step', 'done', `ya paró la gotera, apreté la tapa y todo bien | hice eso y santo remedio`],
  [
    'flow',
    'no-flow',
    `que voy a contar si no cae gota | llevo desde las 8 y son las 9 y la botella vacía, no ha caído ni tantita`,
  ],
  ['change', 'moved', `Ya no vivimos en esa casa`],
  ['change', 'stop', `dejen de fregar con tantos textos`],
  [
    'none',
    'need-part',
    `me regala otra llave de plastico pa la cubeta la perdimos en la mudanza del cuarto |
      Disculpe, ¿cuánto cuesta el empaquecito de hule? El mío ya está aguado`,
  ],
  [
    'change',
    'slow',
    `Con la pieza nueva sale todavía menos que con la vieja, yo creo que viene mal | cambiado. chorrea apenitas`,
  ],
  ['flow', 'not-yet', `aun no mido, no encuentro la botella de litro`],
  ['change', 'ask', `cual lado va para arriba`],
  ['wash', 'need-part', `no hay con qué, la jeringa se la llevó la corriente`],
  ['flow', 'ask', `la botella de 600 sirve o tiene que ser la de litro`],
  ['wash', 'choice', `1`],
  ['flow', 'wrong-number', `numero equivocado amigo`],
  ['none', 'moved', `se lo regalé a la escuelita`],
  [
    'change',
    'need-part',
    `ya no sirven las velas estan gastaditas ocupo dos | aca no tengo repuesto, me lo pueden mandar?`,
  ],
  ['none', 'unclear', `jajaja ese mero, dile al Beto que me debe 50`],
  ['step', 'unclear', `pues según mi hijo sí pero según mi nuera no, vaya usted a saber`],
  ['none', 'start', `START`],
])
