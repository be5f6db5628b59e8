import type { LanguagePack } from './concept'
import { esBreach } from './es-breach'
import { esCare } from './es-care'
import { esContact } from './es-contact'
import { esEveryday } from './es-everyday'
import { esIll } from './es-ill'
import { esOdd } from './es-odd'
import { esPeople } from './es-people'
import { esTalk } from './es-talk'
import { esWant } from './es-want'
import { esWater } from './es-water'

/** Spanish as people text it; entries stand without accents, as the reader strips them. */
export const esPack: LanguagePack = {
  spelling: 'spanish',
  concepts: {
    ...esWater,
    ...esBreach,
    ...esOdd,
    ...esPeople,
    ...esIll,
    ...esCare,
    ...esTalk,
    ...esWant,
    ...esContact,
  },
  numbers: `dos 2, tres 3, cuatro 4, quatro 4, cinco 5, sinco 5, seis 6, siete 7, ciete 7, ocho 8, nueve 9,
    nuebe 9, diez 10, dies 10, once 11, onse 11, doce 12, dose 12, trece 13, trese 13, catorce 14,
    catorse 14, quince 15, quinse 15, dieciseis 16, diesiseis 16, diecisiete 17, diesisiete 17,
    dieciocho 18, diesiocho 18, diecinueve 19, veinte 20, beinte 20, veintiuno 21, veintiun 21,
    veintidos 22, veintitres 23, veinticuatro 24, veinticinco 25, veintiseis 26, veintisiete 27,
    veintiocho 28, veintinueve 29, treinta 30, trenta 30, cuarenta 40, quarenta 40, cincuenta 50,
    sincuenta 50, sesenta 60, setenta 70, ochenta 80, noventa 90, cien 100`,
  weakNumbers: `un 1, una 1, uno 1, medio 0.5, media 0.5, un par de 2`,
  units: {
    minute:
      'minuto, minutos, min, mins, minutitos, minutito, minuts, mts, mns, mn, m, mint, mnts, mnutos, minuto s, mintos, munutos',
    hour: 'hora, horas, hr, hrs, h, hs, ora, oras, horitas, horita',
    second: 'segundo, segundos, seg, segs, s, sg, sgs, sec, segunditos',
    other:
      'litro*, lt, lts, l, galon*, botella*, balde, baldes, cubeta*, vaso, vasos, taza, tazas, jarra, jarras, dia, dias, semana, semanas, mes, meses, ano, anos, año, años, vez, veces, nino, ninos, nina, ninas, hijo, hijos, hija, hijas, persona, personas, jeringa, jeringas, jeringazo*, filtro, filtros, parte, partes, pieza, piezas, tapa, tapas, pm, am, gota, gotas, noche, noches, poco, cosas, cosa, cm, familias, casas, pesos, bebes, bebe, de, manguera, repuesto*, cartucho*, poquito, rato, ratito, momento, problema, pregunta',
  },
  spans: `media hora 30, media hr 30, media ora 30, media horita 30, hora y media 90,
    una hora y media 90, cuarto de hora 15, un cuarto de hora 15, tres cuartos de hora 45,
    medio minuto 0.5, minuto y medio 1.5, un minuto y medio 1.5, una hora 60, una horita 60,
    un minuto 1, una ora 60, 1 2 hora 30`,
  halves: `y media 0.5, y tres cuartos 0.75, y un cuarto 0.25, i cuarto 0.25, y medio 0.5, y cuarto 0.25, i media 0.5, i medio 0.5`,
  light: `dar da dando deja dejo me te se le lo la los las nos les el un una unos unas mi mis su sus tu que de del a al en muy mas tan bien ya esta estan estoy estamos es son ha he han hemos sido ser estar tiene tienen tengo hay para por con todavia aun puedo puede pueden podemos quiere quieren quiero ni mucho nada tanto completamente`,
  common: `${esEveryday} tardar demorar tipo llover lloviendo hay eso mismo huevo huevos tortilla frijol
    frijoles chile limon naranja platano fruta verdura comida jugo cafe leche azucar sal pan el
    la los las un una uno unos unas de del al a en con por para que se su sus mi mis tu tus lo le
    les nos me te y o u e si no es son era eran ser esta este esto esa ese estas estos estan
    estoy estamos estaba fue fui ha he han hemos haber habia muy mucho mucha muchos mas menos tan
    tanto todo toda todos todas otro otra otros cada algo alguien alguno alguna algun nada nadie
    ninguno bien mal mejor peor como cuando donde quien cual porque pues entonces tambien tampoco
    solo solamente nomas asi aqui ahi alla aca hasta desde entre sobre sin contra segun yo usted
    ustedes ella ellos ellas nosotros mio mia suyo suya casa cocina cuarto puerta mesa techo
    calle camino campo pueblo comunidad ciudad escuela iglesia mercado tienda trabajo milpa rio
    cerro dia dias noche tarde manana ayer hoy semana mes ano hora minuto tiempo vez veces lunes
    martes miercoles jueves viernes sabado domingo enero tengo tiene tienen tenemos tenia hago
    hace hacen hacer hizo digo dice dicen decir dijo voy va vamos van ir iba veo ve ver vi vino
    viene vienen venir quiero quiere quieren querer puedo puede pueden poder debo debe saber sabe
    sabemos creo cree pongo pone poner puso dar doy da dan dio llevar llevo lleva traer trae
    traigo dejar dejo deja pasar paso pasa quedar queda quedo encontrar usar uso usa usamos
    comprar compro pagar pago comer come cocinar grande chico pequeno nuevo nueva viejo vieja
    primero primera segundo ultimo alto bajo largo corto frio fria caliente fresco lleno llena
    abierto cerrado roto mano manos cabeza ojo ojos pie pies cara boca pelo hombre mujer amigo
    amiga vecino dios senor senora don dona maria jose juan gracias hola favor perdon sola suelo
    cielo cuelo pela pala pera pero perro carro barro gato pato rato dato plato vaso peso piso
    pozo pollo silla cama ropa sopa copa capa papa mapa sale sales salen salsa salta salto salud
    salvo sol sala malla calla lleve nueve nieve breve alta altar alma arma arroz azul rojo
    blanco gris foto video llamada internet señal recarga luz gas lena fuego lluvia viento tierra
    planta arbol mira mundo alli contigo cuenta juego maldito venga realidad maldita dolares
    adonde recuerdo pais diciendo agente dile real hara oido tuvo tonto modo gracioso respuesta
    darle edad caja llegado banco dare vere carta veamos diria espacio esperaba relacion ojala
    conocido prision salga entrada olvidalo podamos reina sepa pista nota sube mami boda mata
    soio respecto pidio cabron llegamos calor socio solia tema preparado carga area haberlo
    cuentas beso prefiero podremos cuento casado bote lana bala vera pedido tomado debio arana
    podre lucha trajo aquella muestra lisa quieto cabo sepas iras contrato balas tropas decidido
    epoca pesar cerdo pide respuestas torre millas teniendo caballos enfermera viviendo llevamos
    dudo andando clave veia rock mirada corriente oigo cable nosotras intencion tarea quitate
    inspector vean tonta apuesta emperador mono llevaba tratado quedado desierto llevado crear
    necesidad meter salon llevarte cuida dispuesto penso rata mina acaban daria podran
    condiciones contado manten saco fecha comiendo ruta llevarlo empezamos atrapado adoro
    ayudarnos preparados intentado quieran salgo burro llevarme chaqueta cajas empezando bebida
    despedido deba summer serlo llorando ocurra tomalo cuan minas ratas roca peces conductor
    trabajado gane casada condicion aventura aquello septiembre llevando maleta saint socios
    sagrado desaparecer lata aigo acero entrando miro casco salvado muro buddy despejado despacho
    peleas esperado llegaremos crema esperare entrado arrestado sepan cola rocas gritando dejemos
    despedida sofa deuda flor patio palo hueso valle llevaremos entradas velas pagado condenado
    preparada contando ayudante vaca olvidate encerrado rubia empleado dolar tocando requiere
    harris hierro enterrado ensenare cuentos conducta manzana cambiando pecados llevarla manual
    pasta muelle normales tirado grecia cocaina cobra cantante collar arreglarlo vendiendo pico
    perdemos sano ensenarte seguiremos teme distrito preparando subiendo rollo ocurriendo resulto
    exposicion echado tener rosario rancho pal norte beto madrugada mediodia unico lunico mojado
    apretar apretada duerman duermen`,
}
