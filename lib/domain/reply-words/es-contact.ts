import type { LanguagePack } from './concept'

/** Spanish: the texts themselves, ending them, and who is at the phone. */
export const esContact: LanguagePack['concepts'] = {
  texts: `mensaje, mensajes, mensajito, mensajitos, msj, msjs, mensje, mensajes de texto, sms,
    texto, textos, escribir, escriban, escriba, escribas, escribirme, escribiendo,
    escribirnos, escribime, escrivan, escribanme, molestar, molesten, moleste, molestes,
    molestando, molestarme, llamar, llamen, llame, llames, llamando, mandar, manden, mande,
    mandes, mandando, mandarme, enviar, envien, envie, envies, enviando, enviarme, recados,
    notificaciones, avisos, fastidiar, fastidien, jodan, joder, jodas, chinguen, contactar,
    contacten, contacte, recordatorios, avisen, contactarnos, contactarme, llamarnos`,
  phone: 'numero, telefono, celular, cel, linea, chip, tel, num',
  receive: `recibi, recibo, recibido, recibiendo, recibimos, llego, llega el, llegan, llegaron,
    entiendo, entendi, entendimos, entender, leer, lei, leo, contestar, conteste, contesto,
    responder, respondi, saldo, pude leer, entienden, le entiendo`,
  stopWord:
    'alto, parar, pare, paren, paralo, detener, detenga, detengan, deténganse, basta, ya basta, stop, no mas, nomas ya, ya no mas, ya no, ya estuvo, ya estuvo bueno, suficiente, cancelar, cancele, cancelen, cancela, baja, terminar mensajes, ya paren, ya pare, nada mas ya, ya para, parenle, parale, ya parenle, desuscribir',
  stopAsk: `dar de baja, darme de baja, darnos de baja, denme de baja, deme de baja, dame de baja, de de baja, quiero baja, quiero la baja, desuscribir*, desuscrib*, desinscrib*, desubscrib*, anular suscripcion, cancelar suscripcion, cancelar mi suscripcion, cancelar la suscripcion, cancelar el servicio, cancelar mensajes, cancelar los mensajes, cancelen los mensajes, cancelen mi, quitenme, quiteme, quitame, quiten mi numero, quite mi numero, quita mi numero, quiten mi, saquenme, saqueme, sacame, saquen mi numero, saque mi numero, sacar mi numero, borrenme, borreme, borrame, borren mi, borre mi, borra mi, borrar mi numero, eliminar mi numero, eliminen mi, elimine mi, elimina mi, eliminenme, elimineme, remover mi numero, remuevan mi, remover,
    dejenme en paz, dejeme en paz, dejame en paz, dejenos en paz, dejennos en paz, dejenme tranquila, dejenme tranquilo, dejeme tranquilo, dejeme tranquila, dejen de escribir*, dejen de mandar*, dejen de molestar*, dejen de enviar*, dejen de llamar*, dejen de joder*, deje de escribir*, deje de mandar*, deje de molestar*, deje de enviar*, deje de llamar*, deja de escribir*, deja de mandar*, deja de molestar*, deja de enviar*, deja de joder, dejar de recibir, paren de escribir, paren de mandar, paren de molestar, pare de mandar, pare de escribir, parar los mensajes, paren los mensajes, paren con, parenle con, basta de mensajes, basta de, suficientes mensajes, no mas mensajes, no mas sms, no mas msj, no mas textos, ni un mensaje mas, ni un mensaje, no me escriba*, no escriban, no escriba mas, no me escribas, no nos escriban, no me mande*, no me mandes, no manden, no mande mas, no nos manden, no me envie*, no envien, no nos envien, no me llame*, no me molest*, no molest*, no nos molest*, no me contact*, no vuelvan a, no vuelva a, no vuelvas a, ya no me escrib*, ya no me mand*, ya no manden, ya no mande, ya no me envi*, ya no envien, ya no me llam*, ya no me molest*, ya no molest*, ya no escriban, ya no nos, 
    no quiero mas, no quiero mensajes, no quiero sus mensajes, no quiero los mensajes, no quiero recibir, no quiero que me, no quiero estos, no quiero esos, no queremos mensajes, no queremos recibir, no queremos mas, no deseo recibir, no deseo mas, no deseo, no me interesa, no nos interesa, no estoy interesad*, ya no quiero, ya no deseo, ya no queremos, ya no me interesa, no necesito sus mensajes, no necesito mensajes, no necesito mas mensajes, harto de, harta de, hartos de, cansado de sus, cansada de sus, me tienen harto, me tienen harta, me tienen cansad*, ya me cansaron, ya me hartaron, ya cansan, olviden mi numero, olvide mi numero, voy a bloquear, los voy a bloquear, bloquear este, bloqueen mi, retiro mi consentimiento, retirar mi consentimiento, revoco, revocar, quiero salir de, quiero salirme, salirme del programa, sacarme de, no autorizo, quiten este numero, saquen este numero, no mas por favor, ya no por favor, que no me manden, que no me escriban, que paren, que dejen de, ya dejen, ya no sigan, no sigan`,
  end: `terminar, terminen, acaben, borren, borre, borra, borrar, quiten, quite, quitar, eliminen,
    elimine, eliminar, suspender, suspendan, cesen`,
  itStopped:
    'se paro, paro, se detuvo, dejo de gotear, paro de gotear, ya no gotea, no funciona, no esta funcionando, no sirve, ya no sirve, ya no funciona, no trabaja, no jala, ya no jala, no quiere funcionar, dejo de funcionar, dejo de servir, no anda, no camina',
  mistaken: `equivocado, equivocada, errado, confundieron, confundio, confundido, confunden, equivoco`,
  wrongNumber: `numero equivocado, num equivocado, numero ekivocado, numero eqivocado, equivocado, equivocada, ekivocado, equivocados, equibocado, numero incorrecto, numero erroneo, numero errado, numero malo, numero mal, te equivocaste, se equivoco, se equivocaron, se ha equivocado, estan equivocados, esta equivocado, equivocaste, se confundio, se confundieron, me confunde, me confunden, me confundes, persona equivocada, persona incorrecta, no soy esa persona, no soy la persona, no soy quien, no soy yo, no soy ella, no soy el, otra persona, no es mi numero, no es su numero, no es el numero, no es de ella, no es de el, este numero no es, ese no es mi, no es para mi, no era para mi, no son para mi, no es mi filtro, no conozco, no la conozco, no lo conozco, no los conozco, no se quien es, no se quienes son, no se de que hablan, no se de que habla, no se de que me hablan, no se de que filtro, que filtro, cual filtro, de que filtro, yo no tengo filtro, nunca tuve filtro, nunca he tenido filtro, nunca tuve un filtro, aqui no vive, no vive aqui, ya no es su numero, ya no es de, ya no usa este, ya no tiene este, cambio de dueño, cambio de dueno, compre este chip, compre este numero, compre el chip, acabo de comprar este, este numero es nuevo, nuevo dueno, no pertenece, no le pertenece, no corresponde, aqui no hay ningun, aqui no hay ninguna, no esta aqui esa, numero ya no, no hay nadie con ese nombre, nadie con ese nombre, nadie se llama, aqui no es, marcaron mal, marco mal, mal marcado`,
  who: 'quien es, quienes son, quien habla, quien escribe, quien eres, con quien hablo, de parte de quien, quien manda, de quien es',
  name: `maria, jose, juan, ana, carlos, rosa, luis, pedro, miguel, jorge, carmen, lucia, elena, marta, manuel, antonio, francisco, teresa, sofia, diego, andres`,
  moved: `mude, mudamos, mudado, mudo, mudaron, mudando, mudar, mudanza, me mude, nos mudamos,
    nos mude, nos cambiamos de casa, me cambie de casa, cambie de casa, cambiamos de casa,
    cambio de casa, cambiamos de domicilio, cambio de domicilio, nueva casa, nueva direccion,
    otra casa, otro pueblo, otra comunidad, otra ciudad, otra aldea, otro lugar, otro barrio,
    vivimos en otro, vivo en otro, vivo en otra, vivimos en otra, ya no vivo, ya no vivimos,
    ya no estamos en, nos fuimos a vivir, me fui a vivir, nos fuimos de, nos pasamos a,
    trasladamos, traslade, nos trasladamos, me traslade, no vivo ahi, ya no estoy en,
    me pase a, nos pasamos, pase a la casa, me vine a vivir, nos vinimos`,
  startWord:
    'iniciar, empezar, empezar de nuevo, start, reanudar, reactivar, activar, volver a recibir, quiero recibir mensajes, suscribir, suscribirme, quiero recibir, de nuevo los mensajes, inscribirme, reactivenme',
  helpWord:
    'ayuda, ayudenme, ayudame, ayudeme, auxilio, socorro, ayudar, informacion, info, necesito ayuda, ayudenos, ayuden, quiero ayuda, alluda, aiuda, me ayudan, me pueden ayudar, me puede ayudar, pueden ayudarme, puede ayudarme, nos ayudan, asistencia',
}
