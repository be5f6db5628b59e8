import { labelled, type LabelledReply } from './reply-set'

/** A seventh batch, written in five parts while the reader was widened: each was read before it was learnt from. */
export const seventhEsReplies: LabelledReply[] = labelled('es', [
  [
    'wash',
    'unwell',
    `ya lo hago, nomas que mi hermana esta devolviendo el desayuno | ahorita no, estoy cuidando a mi mama que esta ardiendo en calentura | perdon la demora, estuve tumbada con dengue |
      filtro lavado. por cierto el abuelo tiembla desde anoche`,
  ],
  [
    'none',
    'unwell',
    `me chilla la tripa desde que tome esa agua | el bebe tiene llaguitas en la boca y popo aguada | tres de nosotros pasamos la noche en el monte | esta tirado sin sentido y echa espuma† |
      mi bebe no ha probado leche en todo el dia, voltea la cara† | toda la vecindad cayo | mi ija tiene bomito y diarea desde aller | el vebe no kiere comer y ta caliente | tiene calentura y le duele la kabesa |
      anda suelto como 10 beses oy | a todos nos dan retorsijones | mi guagua con correntia | esta inconciente ayuden† | ay sangre en su popo† | mi mama se desmallo esta mañana† | a los dos chiquitos les agarro la soltura |
      mi abuelo amaneció con el estomago hecho un nudo | desde que tomamos de esa agua todos andamos corriendo al baño | la bebe no se prende al pecho† | mi niño vomita hasta el suero† | esta como ido, no reacciona† |
      hizo popo con sangrita† | nos salieron ronchas a todos | por favor ayuda, mi hijo esta convulsionando† | la abuela no ha retenido nada desde ayer† | todos estamos yendo mucho al baño |
      mi esposo tuvo que ir al doctor por el estomago | el popo del niño trae sangre† | mi chiquito anda con cursos | la bebe esta muy debil para mamar† | los niños vomitan despues de tomar |
      no es el mismo, esta muy caliente y temblando | me siento mareado y se me revuelve la panza | no se despierta bien† | mi ultimo no quiere comer y llora agarrandose la panza |
      desde que usamos el filtro a mis hijos les da corrida, tiene que ver? | mi mujer esta ingresada con tifoidea | tiene los ojos hundidos y esta flojita flojita† | se sacudio todo y se le pusieron los ojos en blanco† |
      algo nos cayo mal, todo el dia en el baño`,
  ],
  ['change', 'unwell', `cambiado. es normal que mi abuelita tenga ascos`],
  [
    'flow',
    'unwell',
    `no se, ando en la posta con mi hijo | 7 minutos, oiga mi señora tiene la panza inflamada | 12 min. tambien mi hija anda mal de la pancita desde el lunes | 8 min pero mi bebe tiene temperatura`,
  ],
  [
    'step',
    'unwell',
    `la llave bien. el niño no, esta hirviendo | no hay rajadura pero mi señora esta internada | la tapa bien, los que no estamos bien somos nosotros, todos con retortijones`,
  ],
  [
    'none',
    'broken',
    `escuche un tronido y ahora salpica | le falta un pedacito al borde | el cachorro agarro la manguera | la rosca esta barrida y baila | el filtro se fue rodando por las gradas | se trizo cuando le eche agua caliente |
      de un dia para otro sale el doble, raro | hizo tanto frio que amanecio hecho hielo | el filto se callo y se kebro | se le sale el agua x abajo | la yave se malogro y gotea toda la noche por la base | el valde se rajo |
      los ratones cortaron la mangera | mi ijo lo tiro al suelo | sale agua por los costados | la gata lo tumbo del trastero | tiene una rayita por donde se chorrea | se me partio la orejita de la tapa |
      se derritio con el sol de la lamina | amaneció tieso de hielo | los ratones le hicieron un hoyito | me quede con la llave en la mano | todas las mañanas hay un charco debajo | alguien lo piso |
      el empaque ya no sella, se escapa el agua por la orilla | el chivo mastico la manguera | el agua pasa de golpe como si no hubiera nada adentro | se quedo afuera con la helada y se congelo | la manguera tiene un tajo |
      los niños lo agarraron de pelota | gotea por la base todo el dia y el mueble esta empapado | se quebro la asa y se fue al pozo | se quedo en la camioneta de noche a diez bajo cero |
      cae como si no tuviera nada adentro, antes goteaba despacio`,
  ],
  [
    'wash',
    'broken',
    `listo pero ahora gotea por debajo | se le safo la manguera y se anda tirando el agua | se me resbalo lavandolo y pego en el fregadero | al lavarlo se salio la pieza de adentro y ya no entra`,
  ],
  [
    'step',
    'broken',
    `si hay, como telaraña al costado | si ta rajadito al costado | al apretarle trono la rosca | si, tiene una rajita cerca del fondo | mire bien y hay una rayita abierta en la union`,
  ],
  [
    'none',
    'odd-water',
    `sale como algodon en el agua | el agua se siente babosa | me deja los dientes con arena | olor a gasolina | dicen los niños que sabe a centavo | renacuajos!! | el awa sale cafe | el agua uele mal | beo gusanos adentro |
      agua color soda | estos dias sabe amargo | queda una nata encima del vaso | andan unos bichitos nadando | sabe como a moneda | huele a charco | trae pelusitas blancas | el agua se puso amarillenta |
      salen pedacitos negros con el agua | hay algo verde creciendo en el tanque y el agua tambien esta verde | sabe distinto, como metalico | huele a huevo podrido | vi un gusanito en mi vaso | parece leche |
      tiene una capa de grasa encima | queda arenilla en el fondo del vaso | sabe a tierra`,
  ],
  [
    'wash',
    'odd-water',
    `lo limpie hoy y salio cafe | lo lavé pero el agua salió color de te | lo lave pero el agua sigue oliendo | lavado ayer, hoy el agua sale verdosa`,
  ],
  [
    'none',
    'stop',
    `ya estuvo, no quiero mas | por favor den de baja mi telefono | sus mensajes despiertan al bebe, ya no manden | dejen mi telefono en paz | quiero cancelar | ya no me manden mensages | dejen d mandar msjs |
      borren mi numero xfa | hagame el favor de borrar mi numero | ya me tienen hasta el copete con sus mensajes | ya no ocupo sus recordatorios | quiero salirme de esto | puro mensaje y mensaje, ya dejenme |
      por favor dejen de mandarme esto | ya no quiero ser parte de esto | por que me siguen escribiendo? ya parenle | quitenme de su lista porfa | favor de retirar mi contacto de su sistema | ya basta |
      yo no autorice recibir estos mensajes | ya no nos interesa gracias | NO MANDEN MAS`,
  ],
  [
    'none',
    'wrong-number',
    `nunca he oido de ese programa | me llamo Ramon y vendo zapatos, se confunde | este celular era de Maria pero me lo vendio | aqui hay agua de llave, no somos nosotros | numero ekibocado | se ekivoco de persona |
      no tengo ningun filtro kien es | aqui habla el mecanico, se equivoco | ha de buscar al dueño anterior de esta linea | nosotros ni filtro tenemos | creo que tiene a la persona equivocada |
      disculpe no soy quien usted busca | este numero ahora es de otra persona | quien es Amina? numero equivocado | se equivoco señorita, yo soy Beatriz no Angelica | este no es el numero de la familia Mamani |
      compre este chip el mes pasado, no conozco al dueño | filtro? cual filtro`,
  ],
  [
    'wash',
    'done',
    `lavado y todo, sin fugas y nadie enfermo | ya lo labe | listo esta mañana grax | ok echo | ya quedo relimpio, hasta rechina | mi suegra lo dejo como espejo | me duele la espalda pero ya lo lave |
      estuvo con calentura el niño pero ya anda jugando, y el filtro ya quedo lavado | si, se lavo el martes | todo listo, gracias por el recordatorio | termine de lavarlo, ahora sale mucho mas rapido gracias |
      lo limpie esta mañana como me aconsejo`,
  ],
  [
    'step',
    'no',
    `ni grietas ni fugas, todo seco | no nada d eso | no le veo ninguna rajadura | nel, esta bien apretado | ni gotea ni esta quebrado ni nada | no, nada esta roto | que yo vea no | nop | no no esta rajada |
      seco, nada de fuga`,
  ],
  [
    'none',
    'done',
    `gracias, mi hijo ya se alivio y el filtro corre bien | todo de maravilla con el filtro | sin problemas, funciona excelente, nadie enfermo | todo bien por aca, bastante agua |
      hola solo para decir que el filtro funciona bien`,
  ],
  [
    'wash',
    'slow',
    `lave todo pero hay que tener paciencia | echo pero sige lento | lo labe pero sta muy lento todavia | lo lave con ganas pero sigue de flojo | sale un chorrito que da lastima | lo lave 3 veces y nada de mejoria |
      si lo lave pero el chorro es pobre | lo lave a fondo y sigue perezoso | no hay mucha diferencia despues de lavarlo | ok lo lave pero creo que sigue tapado, puras gotas`,
  ],
  [
    'none',
    'slow',
    `la jarra tarda toda la mañana | cae de a poquito noma | a bajado arto el chorro | se tarda un monton | para llenar un vaso me da tiempo de hacer tortillas | el filtro anda arrastrando los pies |
      con este paso nos vamos a morir de sed | ultimamente tarda una eternidad | antes tardaba 10 min ahora casi una hora | apenas un hilito | cada dia esta mas lento`,
  ],
  [
    'none',
    'no-flow',
    `no sale awa para nada | no kiere salir ni gota | de plano ya no escupe ni una gota | arriba lleno, abajo pelon | no hay agua desde el domingo | se seco por completo | ni una gota desde ayer en la tarde`,
  ],
  [
    'wash',
    'no-flow',
    `no me sale nada de awa | lo lave y quedo mudo, no echa nada | lo lave y ahora no sale nada | lo lavamos pero el agua no quiere pasar`,
  ],
  [
    'flow',
    'flow-figure',
    `como 15mins => 15 | 10 mnts => 10 | beinticinco minutos => 25 | 2hrs => 120 | 7min30 => 7.5 | de las 8:05 a las 8:21 => 16 | un cuartito de hora => 15 | antes 6, ahorita 13 => 13 | casi los 20 min => 20 |
      minuto y medio nomas => 1.5 | dos horas menos cuarto => 105 | 45 seg => 0.75 | como un cuarto de hora => 15 | fueron siete minutos y treinta segundos => 7.5 | nos tomo 25 minutos llenar la botella => 25 |
      3min 45 => 3.75 | creo que como 22 minutos => 22 | 6 minutos 20 segundos => 6.3333 | una hora y veinte => 80 | menos de 5, tal vez 4 y medio => 4.5`,
  ],
  ['change', 'done', `ya lo canbie | el cartucho ya esta puesto | ya le puse la tela nueva`],
  [
    'wash',
    'not-yet',
    `todabia no | lo ago mañana | toy trabajando cuando yege a la casa | deme chance, ando en la pizca | aqui no hay agua pa lavarlo hasta el jueves | ando de viaje, regreso el viernes |
      le voy a pedir a mi hermano que lo haga el fin de semana | lo hago en la noche cuando se duerman los niños | perdon se me olvido, ya lo hago | estoy en un velorio en el pueblo`,
  ],
  [
    'none',
    'need-part',
    `nesesito otra geringa | manden tela la nuestra ya se rompio toda | la liguita ya se pudrio, me manda una | la jeringa ya no chupa, otra porfa | me podrian mandar otro empaque |
      necesitamos una vela nueva para el filtro por favor | donde puedo comprar una jeringa | me pueden dar otra manguera la mia esta vieja | la tela esta gastada por favor manden | la jeringa se perdio en la mudanza`,
  ],
  [
    'none',
    'ask',
    `komo lo labo | a q ora bienen | la flechita va pa arriba o pa abajo | le puedo echar agua caliente | a que hora pasa el muchacho | no le agarre al paso dos | cada cuanto hay que lavarlo | quita el cloro? |
      mi vecina tambien quiere uno, como lo consigue? | sirve para agua de pozo | que es retrolavar | como se cuando cambiar la vela | por favor llameme no entiendo el mensaje`,
  ],
  [
    'none',
    'moved',
    `ya nos cambiamos de ai | ya no vivimos en esa comunidad, nos venimos pa la ciudad | el filtro se lo quedo mi cuñada | ya no vivimos ahi | se lo di a mi mama en el pueblo | nos cambiamos a Cochabamba |
      el vecino se quedo con el filtro cuando nos fuimos`,
  ],
  [
    'none',
    'thanks',
    `grasias | que Dios me la bendiga seño | mil gracias por estar al pendiente | un millon de gracias | muchisimas gracias`,
  ],
  ['step', 'yes', `siii | asi mero | si, ya revise y si esta | si esta apretada`],
  [
    'none',
    'unclear',
    `q onda | jajaja ese no era para usted | quien gano anoche, america o chivas | nos vemos en el partido | llameme | ok mami nos vemos a las 6 | ??`,
  ],
  [
    'change',
    'slow',
    `le puse la nueva y ni asi levanta | lo cambie y sigue goteando de una en una | etapa nueva puesta, el chorro sigue debil`,
  ],
  [
    'step',
    'slow',
    `mejoro tantito pero todavia le falta | lo intente, un poco mas rapido pero todavia lento`,
  ],
  [
    'step',
    'no-flow',
    `le abri la llave, le pegue, le sople y ni sus luces | abri toda la llave y nada`,
  ],
  [
    'flow',
    'broken',
    `en 12 segundos se lleno, eso no es normal | ahora se llena en 20 segundos, demasiado rapido`,
  ],
  [
    'change',
    'not-yet',
    `no ha llegado el señor que sabe cambiarlo | espero a que llegue mi esposo | todavia no recibo la pieza nueva`,
  ],
  ['flow', 'not-yet', `no tengo reloj, al rato le pido a mi vecina | lo mido mañana temprano`],
  ['wash', 'unclear', `mmm | se paro`],
  ['wash', 'yes', `como usted diga`],
  [
    'change',
    'broken',
    `la nueva llego rota | la pieza nueva no encaja y se sale el agua alrededor`,
  ],
  ['flow', 'odd-water', `5 min pero sale turbia | siete minutos, pero apesta`],
  ['wash', 'stop', `ya no mas de esto`],
  ['flow', 'no-flow', `no puedo medir, no sale nada`],
  ['step', 'done', `lo hice y ahora corre bien | la aprete y dejo de gotear`],
  ['step', 'ask', `cual tapa la de arriba o la de abajo?`],
  ['none', 'help', `ayuda`],
])
