/**
 * Everyday Spanish words without a meaning here: those that a slip of the finger would make of a word
 * that has one, and the commonest. They keep guesses at spelling off.
 */
export const esEveryday = `abogado abra abras abriendo abro absurdo acabar acabemos acceso accidente accion acento acerca
  acostado ademas aereo ahorros aiguien alegria alegro alex algunas algunos alimentos amaba
  amabas amado amanda ambas amo andie andy anillos anormal apariencia aparte apetece apostar
  apuestas apuesto aquellas aquellos armas arqueros arrestaron arte artilleria aseguro asesinato
  asesino asunto ataca atacado atacan atacando atacar atacaron ataco atencion atraer atrapada
  atrapados atrapo avion ayudarte babe baby bandeja banos banquete bar bata batalla batallas beca
  bellas bienvenido blade bolsa bosque botes brilla broma bromeando busca buscando buscar
  caballeria caballero caballeros cabana cabe cabello caes calles calma calmate calorias camarera
  camiseta canciller cancion canta cantar canto capaz caras carcel cargando cargo caridad carino
  carrera cartas cartel carteles cartera casados case causa causado cazando cena cenar cerebro
  cerveza cheque cielos cierre cima cita coartada cobrar codigo cody comi comision comite comodo
  completo concepto concurso confesar conjunto consejo consiguio constante construido construir
  consulado contarle contarme contarte contaste contratar control copas corazon coro corredor
  cortesia costar costara costas costo crea crecio creer crei creia crimen cualquier cualquiera
  culpa cumpleanos cura curso cuyo dama damas damos dara darte debamos deben deberia deberiamos
  deberias debes debimos decia decida decide decides decidi decidieron decidimos decidio decidir
  decidiste decirle decirme decirte decision dejan dejanos dejarnos dejes delante demas demonios
  deporte deportes derecha derrotado desarrollar desarrollo desayunar desayuno deseando desee
  desorden despertado desperte desperto destino detras deudas diablos dices dicho diga digas dije
  dijiste dime dinero dinos dioses dira dire disposicion divertido doler dolera donnie drogas
  dude eche edificio ejercito encanta encender encendida encendido encontrado encontre encontro
  enemigo enganado entendemos entramos entrar entremos entrenado entro eras error esas escandalo
  escena escenario escenas escolar escolta escopeta escritor escucha escuchame escuchar escuche
  espacial espaciales espada espalda especial esperabamos esperaremos esperemos estabamos
  estacion estara estaras estare estaremos estaria estarlo estemos esten estes estribor
  estructura estupido estuviera estuviste evaluacion examinar excepto existe explorador facil
  falda final finalmente flanco forma formas fotos francia fuiste fumando futuro galletas ganar
  garantia gastos gesto gobierno grados gramos grandes grita grupo guante guantes guardian
  guardianes guardias guerra gustado gustan gustas haberle habiendo habitacion hablamos habra
  habria hacha hagan hagas hallado has hayas haz hazlo hermosa hermosas hermoso hermosos heroe
  hicieron hiciste historia hogar hombres honor horror humano humanos huyo idiota imbecil
  importante imposible incluso increible infierno informado ingles inspeccion inteligente intento
  interesante inventar ire iremos irme irnos irse irte isla izquierda japonesa jedi jeep jennings
  judio jugar juntos juro kate lady lago lamento latas lazo leerlo leve libertad libro libros
  lios llegaba llevare llevarse llevaste llevate loca locura lois lola luces macho maddie
  majestad mantener margen martillo marzo matado matar mataria matas mate mato mayoria mecanica
  mecanico mejores memoria mental metas meti metido metiendo metio meto metros mide miedo
  mientras miles milla millones minimo mirad miran mirando mirar mito monos moon morfina moria
  morimos morir morira moriran moriras morire moriremos moriria mueva muevanse muros musica nate
  nave navidad negar nivel nora normas notar notas note noticias nuca ocurre ocurren ocurrido
  ocurrio ocurrir ocurrira odio oficial oimos oir opina opinion oportunidad opuesto orbita
  ordenes ordinario oren oro otras oye paciente pacientes pagando pajarito palabra palabras panel
  papel papito paquete paquetes parado pareceria parecia pares parque pasaje pasear pasen paseo
  patan pavo pavos pecado pedimos pedo pegale pelea peleado pelear peligro peligroso peludo pena
  pensaba pensando pensar pense perla permiso pesa pesadilla pesado pida pidiendo pidieron
  pierdas piloto pilotos pistola pito placer plata platos pobre poesia policia politica politicas
  politico politicos polo pondria ponemos posicion precio preocupes prepare presenta presentado
  preston princesa probable probando profesor prometo propia propio pruebas publico pudiera
  pudieramos pudieran pudieras pudieron pudiese pudiste puedas puto putos qaeda quedaras
  quedaremos quedarnos quedaron quedate queen queramos quereis queres queriamos querido queridos
  queriendo querra querran querras queso quieta quise quiza quizas rama rastrear razon razones
  reales realista realizar realmente reciente recomiendo recordar recordarlo recorrido recuerda
  recuerdas regla reglas reservado respeto resto restos retirada retirado reto reunion rey
  rezando ries rinon risa roba robot roma rubio rudo rueda ruido rusa ruso ryan saberlo sabia
  sabias sabiendo sacaremos sagrada salgas salmon salte saluda salvar sana santuario sara
  sargento sauditas sean seas seda seguiras segunda seguridad senado sensores sentir separado
  separados seran seras seria serio sida siempre siendo sientate sientes siguiendo silencio
  simplemente sistema sitio situacion solas soldado soldados solos soltera somos sonado sono
  sonriendo soportar sorpresa sra srta subio subo sucede sucedio sueltala sueltalo suerte supo
  supone supongo tango tarado tarta temas temia temo temor ten tendremos tengas tenias tercero
  terminemos tipos tiros toco tomemos tomen tomes tono tontos totalmente trabajamos tracy
  traducido traje trasero trata tratando trataron tratas trato traves tren triste tropa turistas
  tuya tuyo ultima unica universidad valor vamonos varon vayan vayas vea veas vendra vengan vengo
  venid venido veras verdadero verla verlas verlo verme verse verte ves vestido vete viaja vias
  vidas viera vinieron vinos vio viste visto vito vivi volar volo volvemos volveran volveras
  volveremos volveria volverme volverse voz vuelto`
