import type { LanguagePack } from './concept'

/** Spanish: the filter, its water, and what can be wrong with them. Written without accents. */
export const esWater: LanguagePack['concepts'] = {
  water: 'agua, aguas, aguita, awa, agwa, augua, agu, chorro, chorrito, caudal, presion',
  filter: 'filtro, filtros, filtrito, fltro, purificador, aparato, equipo, kit, unidad, maquina',
  piece: `tapa, tapas, tapita, tapon, manguera, mangueras, manguerita, tubo, tubos, tubito, llave, grifo, canilla, cartucho, cartuchos, fibra, fibras, membrana, carbon, etapa, etapas,
    pieza, piezas, parte, partes, jeringa, jeringas, jeringuilla, empaque, sello, arandela, rosca, conector, carcasa, repuesto, repuestos, valvula, asa, soporte, codo, niple, abrazadera, liga, refaccion`,
  cloth: 'tela, telas, trapo, trapito, panito, malla, prefiltro, colador, manta',
  container:
    'balde, baldes, cubeta, cubetas, tanque, bidon, recipiente, tina, tinaco, tambo, olla, garrafon, botella, botellas, jarra, vasija, deposito, contenedor, cubo, tinaja',
  edge: `lado, lados, costado, costados, abajo, debajo, fondo, union, uniones, junta, orilla, orillas, borde, bordes, rosca, todos lados, todas partes, por la tapa, por la manguera, por el tubo, base, piso, suelo, por fuera, afuera, por la pared, por encima, por arriba`,
  source: 'rio, pozo, quebrada, arroyo, laguna, manantial, lluvia, vertiente, ojo de agua, noria',
  flow: `sale, salen, salia, saliendo, salio, salir, sal, corre, correr, corriendo, cae, cayendo, caia, baja, bajando, bajar, fluye, fluyendo, fluir, pasa, pasan, pasando, pasar, filtra, filtran, filtrando, filtrar, da agua, dando agua, brota, viene, viniendo, llega, llegando, echa, echando, bota, botando, tira, tirando, sacar, saca, suelta, llena, llenar, llenando, llenarse, llene, se llena`,
  drip: `gota a gota, goteo, goteando, gotea, gotas, gotitas, gotita, a gotas, a gotitas, por gotas, de a gotas, chorrito, hilito, un hilo, hilo, chorritos, puras gotas, puro goteo`,
  slow: `lento, lenta, lentos, lentas, lentamente, lentito, lentita, lentisimo, lentisima, despacio, despacito, despasio, debil, debiles, debilito, flojo, floja, bajito, bajita, menos agua, menos chorro, menos presion, menos caudal, menos que antes, menos cantidad, apenas, casi no, casi nada, no alcanza, no nos alcanza, no da abasto, ha bajado, bajo mucho, bajo bastante, bajo la presion, bajo el chorro, bajo el caudal, baja presion, poca presion, poco caudal, poca fuerza, sin fuerza, sin presion, poquito a poco, poco a poco, de a poco, de a poquito, de poquito, a poquitos, de a poquitos, ya no sale igual, no sale igual, emojislow, disminuyo, disminuido, disminuye, reducido, se demora, demora, demorando, demoro, demorado, demorada, demorar, demoran, tarda, tardando, tardo, tardado, tardada, tardar, tardan, tortuga, lerdo, lerda, pausado, insuficiente, escaso, escasa`,
  little:
    'poco, poca, poquito, poquita, poquitito, pokito, poko, poka, pokita, poquisima, poquisimo, menos, pocas, pocos, un poquito, un poco, bien poquita, nomas un poco',
  long: `mucho tiempo, mucho rato, muchisimo, horas y horas, muchas horas, todo el dia, toda la noche, toda la manana, una eternidad, eterno, siglos, rato largo, largo rato, bastante tiempo, medio dia, tanto tiempo, demasiado tiempo, mas tiempo, varias horas, un monton de tiempo, dura mucho, se lleva mucho`,
  none: 'nada, vacio, vacia, cero, ni gota, ni una gota, ninguna gota, ni gotas, seco, seca, nadita, ni un poco, ni madres',
  blocked: `tapado, tapada, tapados, tapo, se tapo, tapando, tapar, taponado, taponada, obstruido, obstruida, bloqueado, bloqueada, bloqueo, atascado, atascada, atasco, atorado, atorada, atoro, trabado, trabada, trancado, trancada, atrancado`,
  fast: 'rapido, rapida, rapidito, veloz, fuerte, ligero, aprisa, rapidisimo, de prisa, rapidamente, ligerito',
  tooFast: `demasiado rapido, demasiado rapida, demasiado fuerte, demaciado rapido, a chorros, a chorro, chorros, de golpe, mas rapido de lo normal, mas rapido que nunca, mas rapido de lo que debe, rapido de mas, como llave abierta, como si no filtrara, sin parar, pasa directo, sale directo, pasa de largo, rapidisimo, a borbotones, de un solo golpe, demasiada agua, mucha fuerza, como caño, como grifo abierto`,
  good: `bien, bueno, buena, buen, bonito, excelente, perfecto, perfecta, normal, normalmente, funciona, funcionando, sirve, trabaja, trabajando, contenta, contento, feliz, correctamente, parejo, jala, jalando, de maravilla, al cien, al 100, chevere, chido, rico, rica, lindo, de lujo, nitido, fenomenal`,
  bad: 'mal, malo, mala, malos, malas, malisimo, feo, fea, peor, pesimo, horrible, terrible, malito, malita, grave',
  better: `mejor, mejoro, mejorado, mejorando, arreglado, se arreglo, ya se arreglo, solucionado, se soluciono, mas rapido, mas rapida, mas fuerte, mas agua, de nuevo sale, ya sale, ya sale bien, ya corre, ya salio, ya funciona, ya quedo, ya cae, ya esta saliendo, ya esta bien, volvio, volvio el agua, volvio a salir, como antes, como nuevo, ya jala, regreso el agua, resuelto, ya sirve, ya baja, ahora si, recupero`,
  same: 'igual, lo mismo, igualito, la misma, el mismo, mismo, sin cambio, no cambia, no cambio, no hay cambio, no cambio nada, no mejora, no mejoro, no hubo cambio, nada cambio, ningun cambio, no se arreglo, no ayudo, no funciono, no sirvio',
  broken: `roto, rota, rotos, rotas, rompio, rompido, rompida, rompi, rompe, romper, rompimos, rompieron, quebrado, quebrada, quebro, quiebra, quebre, quebraron, rajado, rajada, rajo, raja, rajadura, rajaduras, rajadito, rajadita, grieta, grietas, agrietado, agrietada, agrieto, partido, partida, partio, se partio, rasgado, rasgada, rasgo, reventado, reventada, revento, reventaron, agujero, agujereado, agujereada, hoyo, hoyito, huequito, hueco, agujerito, perforado, perforada, pinchado, pinchada, dañado, danado, danada, dano, se dano, se dañó, estropeado, estropeada, estropeo, descompuesto, descompuesta, descompuso, averiado, averiada, mordido, mordida, mordio, mordisco, mastico, despego, despegado, despegada, solto, se solto, suelto, suelta la, zafado, zafo, se zafo, desarmo, desprendio, se desprendio, cortado, cortada, corto la, derretido, derritio, quemado, quemo, aplastado, aplasto, pedazos, hecho trizas, destruido, malogrado, malograda, malogro, flojo la tapa, se salio la, se desconecto, desconectado, desconecto, astillado, astillada, fisura, fisurado, fisurada, trizado, trizada, se trozo, trozado`,
  leak: `fuga, fugas, fugando, se fuga, fuga de agua, gotera, goteras, se sale, se esta saliendo, saliendose, se le sale, se salia, derrama, derramando, derramo, se derrama, chorrea, chorreando, se chorrea, escurre, escurriendo, se escurre, se escapa, escapa agua, escape de agua, filtracion, filtraciones, se riega, regando, se bota, se tira, tirando agua, moja, mojando, se moja, mojado, gotea por, gotea de, goteando por, gotea agua por, rezuma, charco, pierde agua, perdida de agua, perdiendo agua, bota agua por`,
  fall: `cayo, se cayo, caida, caido, cayeron, tiro, se me cayo, se nos cayo, caer, tumbo, tumbaron, tumbado, boto al suelo, golpe, golpeo, golpeado, golpearon, volteo, voltearon, dejo caer, dejaron caer, callo, se callo, al suelo, al piso`,
  frozen:
    'congelado, congelada, congelo, se congelo, hielo, helado, helada, escarcha, heladas, se helo, congelaron, congela',
  mended: 'arregle, reparado, reparada, repare, arreglamos, pegue, pegado, remende',
  clean:
    'limpia, limpio, clara, claro, clarita, limpiecita, transparente, cristalina, pura, limpias, clarito, limpita',
  odd: `negra, negro, negras, negruzca, cafe, marron, amarilla, amarillo, amarillenta,
    amarillento, verde, verdosa, verdoso, roja, rojiza, rojizo, gris, grisacea, blanca,
    blanquecina, lechosa, turbia, turbio, turvia, turbias, mugre, mugrosa, lodo, lodosa,
    barro, barrosa, tierra, arena, color, de color, oscura, oscuro, particulas, puntitos,
    pedacitos, basuritas, basura, cosas flotando, flotando, gusano, gusanos, gusanitos,
    bichos, bicho, bichitos, animalitos, larvas, lama, limo, baba, babosa, espuma, espumosa,
    oxido, oxidada, polvo, sedimento, moho, pelusa, residuos, no clara, tinta, ceniza, hollin,
    choca, chocolatosa`,
  oddSmell: `apesta, apestosa, apestoso, hediondo, hedionda, hiede, hediondez, podrido, podrida, mal olor, malos olores, mal sabor, feo olor, feo sabor, olor feo, sabor feo, olor raro, sabor raro, sabe mal, sabe feo, sabe fea, sabe raro, sabe rara, sabe horrible, huele mal, huele feo, huele fea, huele raro, huele rara, huele horrible, huele a, sabe a, olor a, sabor a, uele, amarga, amargo, salada, salado, agria, acida, metalico, metalica, asco, asquerosa, asqueroso, guacala, fetido, fetida, pestilente, peste, tufo, extraño olor, raro olor, olor extrano, sabor extrano, raro sabor, jabonosa`,
  smell: 'olor, olores, huele, oler, oliendo, huelen, olia',
  taste: 'sabor, sabe, saben, gusto',
  fuel: `gasolina, petroleo, diesel, disel, kerosene, queroseno, querosen, keroseno, combustible, aceite, aceitosa, quimico, quimicos, quimica, pintura, solvente, thinner, veneno, pesticida, pesticidas, insecticida, fertilizante, herbicida, bencina, nafta, agroquimico, acpm, cloro fuerte`,
  dirty: `sucio, sucios, sucia, sucias, mugroso, cochina, cochino, percudido`,
}
