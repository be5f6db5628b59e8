import { labelled } from './reply-set'

/** Spanish replies about the water and the filter, labelled by hand for the tests. */
export const esTroubleReplies = labelled('es', [
  [
    'wash',
    'slow',
    `
    lento | muy lento | lenta | está lento | esta muy lento | el agua sale lenta | sale lento | sale muy despacio | despacio | sale despacito | sale poca agua | poca agua | sale poquita agua | muy poca agua |
    sale poco | sale muy poco | poco chorro | sale un hilito | un hilito de agua | gota a gota | sale gota a gota | puras gotas | gotea nomas | solo gotea | apenas sale | apenas gotea | casi no sale | casi no sale agua |
    tarda mucho | tarda demasiado | se tarda mucho en llenar | demora mucho | se demora bastante | tarda una eternidad | todo el dia para llenar | no sale bien | no sale con fuerza | sale sin fuerza | sale con poca presion |
    sale menos agua que antes | menos agua | ya no sale como antes sale poquito | bajo mucho el agua | ha bajado el chorro | cada vez mas lento | cada dia sale menos | el filtro esta lento | esta bien lento |
    listo pero sigue lento | ya lo lave pero sigue lento | lo lavamos y sigue igual de lento | ya lavé y sale poquita | hecho pero todavia sale poca agua | si lento | si, muy lento | no, esta lento | buenos dias sale muy lento el agua |
    gracias pero sigue lento | lentoo | lnto | letno | lentisimo | el agua cae despacio | no nos alcanza el agua sale poca | el flujo esta debil | sale debil | poca presión | el agua baja muy lento | mucho rato para un litro |
    porque sale tan lento? | se puso lento | desde ayer esta lento | estaba bien pero ahora esta lento | el chorro es bien delgadito y lento | pokita agua sale | no sale mucha agua | sale agua pero muy despacio`,
  ],
  [
    'step',
    'slow',
    `sigue lento | sigue igual | igual | lo mismo | no mejora | no mejoró | no cambió nada | todavia lento | sigue saliendo poca | mejoro poco sigue lento | no hubo cambio | sigue sin fuerza | hice eso y sigue lento`,
  ],
  [
    'wash',
    'no-flow',
    `
    no sale | no sale agua | no sale nada | no sale nada de agua | ya no sale | ya no sale agua | no corre | no corre el agua | no cae agua | no baja agua | no pasa el agua | no pasa nada de agua | no hay agua | no tenemos agua |
    sin agua | estamos sin agua | nada de agua | ni una gota | no sale ni gota | dejo de salir | dejó de salir agua | está tapado | esta tapado el filtro | se tapo | tapado | se tapó la manguera | bloqueado | obstruido | atascado |
    ya lo lave y no sale nada | listo pero no sale agua | lave el filtro y ahora no sale | desde ayer no sale agua | no filtra | no esta filtrando | el filtro no da agua | no fluye | nada sale | no ay agua | no sale hagua | no gotea ni sale nada |
    se seco no sale nada | seco, nada | esta trancado`,
  ],
  ['flow', 'no-flow', `nada | no sale | cero | nada de nada | no lleno, no sale agua`],
  [
    'wash',
    'broken',
    `
    roto | está roto | esta rota la tapa | la tapa esta rajada | tapa rajada | se rajo | se rajó la tapa | rajado | rajada | esta quebrado | se quebro | se quebró | se rompio | se rompió la manguera | la manguera esta rota | la llave se rompio |
    tiene una grieta | hay una grieta | grieta en la tapa | tiene un hoyo | hay un hueco | tiene un agujero | hay fuga | fuga | tiene fuga de agua | se sale el agua por un lado | sale agua por el lado | sale agua por la tapa | sale agua por abajo |
    gotea por abajo | gotea por la union | gotea de la tapa | se chorrea | se esta saliendo el agua | se tira el agua | se derrama | se cayo | se cayó el filtro | se me cayo | se nos cayo al suelo | mi hijo lo tiro | mi hija tiro el filtro |
    se congelo | se congeló anoche | congelado | esta congelado | amanecio congelado | sale demasiado rapido | demasiado rápido | sale muy rapido el agua | sale a chorros | pasa de golpe | se daño | se dañó el cartucho | esta dañado | se zafo la manguera |
    la rata mordio la manguera | el perro mordió la manguera | la tapa se partio | partido | fisura en la tapa | listo pero se rajo la tapa | ya lave pero esta rajado | esta lento y ademas roto | si roto | no esta lento, esta roto | no, esta rajado |
    se desarmo | se reventó la manguera | el balde tiene una rajadura | kebrado | rroto | esta malogrado el caño`,
  ],
  [
    'change',
    'odd-water',
    `
    agua negra | sale agua negra | el agua sale negra | el agua esta negra | sale negra | agua café | sale cafe | agua amarilla | sale amarillenta | agua turbia | sale turbia | está turbia | el agua esta sucia | sale sucia | agua sucia | sale con tierra | tiene arena |
    tiene basuritas | hay bichos en el agua | tiene gusanos | hay animalitos en el agua | huele mal | huele feo | el agua huele mal | mal olor | tiene mal olor | apesta | hiede | huele a huevo podrido | sabe mal | sabe feo | mal sabor | sabe raro | tiene un sabor raro |
    sabe a metal | amarga | salada | huele a gasolina | olor a gasolina | huele a petroleo | huele a diesel | sabe a quimico | olor a quimico | huele a pintura | tiene aceite | agua verde | el agua esta verde | sale espuma | agua lechosa | sale roja | agua con oxido |
    no sale clara | el agua no esta limpia | no esta clara | listo pero sale negra | cambie y sale agua negra | el agua esta fea | agua mala | el agua tiene color | sale como te | turvia | uele feo | sale oscura`,
  ],
  [
    'none',
    'unwell',
    `
    mi hijo tiene diarrea | mi hija tiene diarrea | diarrea | diarea | mi niño tiene diarreas | el bebe tiene diarrea | los niños estan con diarrea | tiene corrida | mi hijo esta enfermo | mi hija esta enferma | estamos enfermos | estoy enferma | enfermo | todos enfermos |
    mi esposo esta enfermo | mi mama esta mala | mi hijo esta malito | mi niña está mal | mi hijo no se siente bien | me siento mal | vomito | esta vomitando | mi hija vomita | tiene vomitos | vomitó toda la noche | fiebre | tiene fiebre | tiene calentura |
    dolor de estomago | le duele el estomago | le duele la barriga | dolor de panza | me duele la panza | retortijones | colera | tifoidea | disenteria | intoxicados | le cayo mal el agua | nos cayo mal el agua | lo llevamos al hospital | esta en el hospital |
    el doctor dice que es el agua | listo pero mi hijo esta enfermo | esta lento y mi hija tiene diarrea | ya lave pero el niño tiene diarrea | mal del estomago | está mal de la barriga | anda suelto del estomago | la familia se enfermo | mis hijos se enfermaron con el agua |
    diarria | bomito | emferma mi niña | mi abuelita esta enferma | mi wawa tiene diarrea | mi chamaco anda con diarrea | tengo náuseas | mareos y vomito`,
  ],
  [
    'none',
    'unwell',
    `
    mi hija no quiere tomar nada y esta muy dormida† | el bebe no quiere mamar† | no quiere pecho† | mi bebé no mama† | no puede beber† | mi hijo no toma nada y tiene fiebre† | vomita todo† | todo lo vomita† | vomita todo lo que come† | no retiene nada† |
    tuvo convulsiones† | convulsiona† | le dio un ataque† | está inconsciente† | se desmayo† | mi niño se desmayó† | no despierta† | no reacciona mi bebe† | esta aletargada† | el niño esta muy decaido† | diarrea con sangre† | popo con sangre† | hay sangre en las heces† |
    evacua con sangre† | mi hija con diarrea y muy dormida† | solo duerme y tiene diarrea mi hijo† | no quiere tomar agua mi bebe† | sangre en la popo de mi niño† | el bebe no se mueve† | devuelve todo lo que toma†`,
  ],
  [
    'flow',
    'flow-figure',
    `
    12 => 12 | 7 => 7 | 7 minutos => 7 | 7 min => 7 | 7min => 7 | 7 mins => 7 | como 7 => 7 | como 15 minutos => 15 | unos 15 minutos => 15 | mas o menos 15 => 15 | tardo 12 minutos => 12 | tarda 12 => 12 | 12 minutos en llenar la botella => 12 | doce => 12 | doce minutos => 12 |
    veinticinco minutos => 25 | veinte y cinco => 25 | treinta y cinco minutos => 35 | media hora => 30 | 1/2 hora => 30 | una hora => 60 | 1 hora => 60 | 1h => 60 | 1h30 => 90 | 1 hora 20 min => 80 | hora y media => 90 | una hora y media => 90 | dos horas => 120 | 2 hrs => 120 |
    cuarto de hora => 15 | un cuarto de hora => 15 | tres cuartos de hora => 45 | 4:30 => 4.5 | 4.5 => 4.5 | 4,5 => 4.5 | 4 y medio => 4.5 | 4 minutos y medio => 4.5 | 4 min 30 => 4.5 | 4 min 30 seg => 4.5 | 4'30" => 4.5 | 90 segundos => 1.5 | 90 seg => 1.5 | 45 s => 0.75 |
    dos minutos y medio => 2.5 | minuto y medio => 1.5 | diez => 10 | DIEZ MINUTOS => 10 | 10! => 10 | 10. => 10 | son 10 => 10 | fueron 10 minutos => 10 | 5 a 6 minutos => 5.5 | entre 10 y 12 minutos => 11 | 20 minutitos => 20 | 20 mintos => 20 | treinta => 30 | cuarenta y cinco minutos => 45 |
    ahora 8 minutos => 8 | hola 8 minutos => 8 | 8 gracias => 8 | se lleno en 9 minutos => 9 | la botella tardo 9 min => 9 | 3 => 3 | 1 => 1 | 2 min => 2 | un minuto => 1 | un litro en 6 minutos => 6 | lento, 20 minutos => 20 | sigue lento 25 min => 25 | ya lave, ahora 5 minutos => 5 |
    dies minutos => 10 | onse => 11 | cinco => 5 | siete minutos => 7 | quince => 15 | 6 minutos con 40 segundos => 6.6667 | demora 13 => 13 | 14 minutos despues de lavar => 14 | me tardo 16 min => 16 | 2,5 => 2.5`,
  ],
  [
    'step',
    'flow-figure',
    `12 => 12 | 4 => 4 | 12 minutos => 12 | ahora 6 minutos => 6 | 3 minutos => 3 | todavia 18 min => 18`,
  ],
  ['none', 'flow-figure', `12 => 12 | 10 minutos en llenar => 10`],
])
