import type { RuleTexts } from './rule-texts';

const capital = (text: string): string => text.charAt(0).toUpperCase() + text.slice(1);
const because = (reason: string): string =>
  reason === '' ? 'No se escribió un motivo.' : `Motivo: ${reason}`;

/** Sentences of the findings, Spanish. */
export const es: RuleTexts = {
  'people-not-clear': ({ how }) =>
    how === 'never'
      ? 'Se dio aire y nadie había confirmado que las personas estaban a salvo, con ojos y oídos protegidos. El aire lanza piezas, piedras y agua.'
      : 'Se confirmó que las personas estaban a salvo solo después del primer aire. El aire lanza piezas, piedras y agua desde el primer momento.',
  'couplings-not-pinned': () =>
    'Pasó aire por una manguera cuyos acoples no tenían pasador. Un acople que se suelta da latigazos.',
  'cautions-not-read': () =>
    'En esta visita no se había leído la tarjeta de precauciones antes del primer aire.',
  'interlock-passed': ({ interlock, reason }, say) =>
    `Se siguió sin "${say.lock(interlock)}". ${because(reason)}`,
  'air-before-water-off': ({ how, ...zone }, say) =>
    how === 'never'
      ? `Se dio aire en ${say.zone(zone)} y nunca se anotó el corte del agua. El aire y el agua pueden volver hacia la red.`
      : `Se dio aire en ${say.zone(zone)} antes de cortar el agua. El aire y el agua pueden volver hacia la red.`,
  'air-before-relief': ({ how, ...zone }, say) =>
    how === 'never'
      ? `Se dio aire en ${say.zone(zone)} y nunca se anotó que se soltara la presión del tubo. Las dos presiones actúan juntas.`
      : `Se dio aire en ${say.zone(zone)} antes de soltar la presión del tubo. Las dos presiones actúan juntas.`,
  'air-before-sensitive-part': ({ part }, say) =>
    `Pieza delicada (${say.part(part)}) protegida solo después del primer aire. El aire rápido la rompe.`,
  'sensitive-part-left': ({ part, reason }, say) =>
    `Pieza delicada (${say.part(part)}) dejada en su lugar con aire. ${because(reason)}`,
  'sensitive-part-unknown': ({ part, how }, say) =>
    ({
      'not-looked-for': `Hubo aire y nadie anotó haber buscado una pieza registrada: ${say.part(part)}.`,
      'not-found': `Pieza delicada no hallada (${say.part(part)}), y hubo aire. Pudo estar en el camino.`,
      'not-protected': `Pieza delicada hallada (${say.part(part)}), y hubo aire sin retirarla ni desviarlo.`,
    })[how],
  'air-through-backflow': () =>
    'El aire entró por donde pasa por el conjunto antirretorno. Eso rompe sus piezas, y lleva al agua potable.',
  'air-with-backflow-open': ({ valve, how }, say) =>
    how === 'open'
      ? `${capital(say.valve(valve))} no estaba cerrada cuando se dio el primer aire.`
      : `No se anotó ${say.valve(valve)} antes del primer aire.`,
  'connection-not-recorded': () => 'Hubo aire y nadie anotó dónde se unió la manguera al sistema.',
  'no-zone-open': (zone, say) =>
    `La última zona abierta, ${say.zone(zone)}, se cerró con aire. Un sistema cerrado recibe toda la presión.`,
  'over-ceiling': ({ pressurePsi, ceilingPsi, overPsi, airSeconds, setBy, ...zone }, say) =>
    `El manómetro marcó ${say.pressure(pressurePsi)} en ${say.zone(zone)}, ${say.pressure(overPsi)} sobre su tope de ${say.pressure(ceilingPsi)}, que pone ${say.ceiling(setBy)}` +
    (airSeconds > 0 ? `, en ciclos de ${say.time(airSeconds)} en total.` : '.'),
  'regulator-over-ceiling': ({ pressurePsi, ceilingPsi, setBy, ...zone }, say) =>
    `El regulador estaba en ${say.pressure(pressurePsi)} cuando entró aire en ${say.zone(zone)}, cuyo tope es ${say.pressure(ceilingPsi)}, que pone ${say.ceiling(setBy)}.`,
  'regulator-not-recorded': () => 'No se anotó el regulador antes del primer aire.',
  'no-gauge-reading': (zone, say) =>
    `No se leyó el manómetro en ${say.zone(zone)}; nadie puede decir qué presión recibió.`,
  'visit-cut-short': ({ why, zonesLeft }, say) =>
    `La visita se interrumpió: ${say.why(why)}. ${zonesLeft === 1 ? 'Una zona todavía tiene' : `${zonesLeft} zonas todavía tienen`} agua; alguien debe volver antes de la helada.`,
  'zone-without-air': (zone, say) =>
    `No entró aire en ${say.zone(zone)} y nadie dijo por qué. Su agua sigue en la tierra.`,
  'zone-skipped': ({ reason, ...zone }, say) =>
    `Se saltó ${say.zone(zone)}; su agua sigue en la tierra. ${because(reason)}`,
  'too-few-cycles': ({ cycles, wanted, ...zone }, say) =>
    `${capital(say.zone(zone))} recibió ${cycles === 1 ? 'un ciclo' : `${cycles} ciclos`} de aire y hacen falta ${wanted}: entre ellos el agua se junta en los puntos bajos.`,
  'never-dry': ({ sign, ...zone }, say) =>
    `${capital(say.zone(zone))} nunca llegó a neblina: lo último visto en los aspersores fue ${say.sign(sign)}. Queda agua.`,
  'end-sign-missing': (zone, say) =>
    `Nadie anotó qué salía por los aspersores de ${say.zone(zone)} al cortar el aire.`,
  'air-unattended': ({ seconds, ...zone }, say) =>
    `Hubo aire en ${say.zone(zone)} durante ${say.time(seconds)}. Nadie pudo estar vigilando.`,
  'cycle-too-long': ({ seconds, capSeconds, ...zone }, say) =>
    `Un ciclo de ${say.zone(zone)} duró ${say.time(seconds)}; sus aspersores aguantan ${say.time(capSeconds)}. Sin agua se calientan.`,
  'air-after-dry': ({ seconds, ...zone }, say) =>
    `Se dio aire otra vez en ${say.zone(zone)} cuando ya estaba seca, durante ${say.time(seconds)}. Sin agua los aspersores se calientan.`,
  'tank-burst-pattern': ({ cycles, seconds, ...zone }, say) =>
    `${capital(say.zone(zone))} recibió ${cycles} golpes de unos ${say.time(seconds)}. Soltar un tanque a golpes deja agua y sacude el tubo.`,
  'rest-too-short': ({ seconds, wantedSeconds, ...zone }, say) =>
    `${capital(say.zone(zone))} descansó ${say.time(seconds)} entre dos ciclos en vez de ${say.time(wantedSeconds)}.`,
  'air-against-water': ({ airSeconds, expectedSeconds, how, ...zone }, say) =>
    how === 'too-little'
      ? `${capital(say.zone(zone))} recibió ${say.time(airSeconds)} de aire; el agua de su tubo pide unos ${say.time(expectedSeconds)}.`
      : `${capital(say.zone(zone))} recibió ${say.time(airSeconds)} de aire; con unos ${say.time(expectedSeconds)} se habría vaciado. Algo puede estar tapado o roto.`,
  'order-against-plan': ({ plannedPlace, place, ...zone }, say) =>
    `${capital(say.zone(zone))} se sopló en el lugar ${place}; en el plan ocupa el lugar ${plannedPlace}.`,
  'compressor-too-small': ({ compressor }) =>
    `${compressor} entrega menos aire del que pide este sistema. El aire pasa entonces sobre el agua en vez de empujarla.`,
  'compressor-not-recorded': () => 'Nadie anotó qué compresor dio el aire.',
  'air-never-stopped': (zone, say) =>
    `Nunca se anotó el final de un ciclo de ${say.zone(zone)}; su tiempo de aire no se conoce.`,
  'stop-without-start': () => 'Se anotó el corte del aire en un ciclo que no tiene comienzo.',
  'hose-off-under-pressure': () =>
    'La manguera se quitó antes de purgarla. Un acople con presión da latigazos.',
  'close-down-incomplete': ({ steps }) =>
    `Solo ${steps === 1 ? 'está anotado 1 paso' : `están anotados ${steps} pasos`} de 3 para apagar el aire: compresor apagado, manguera purgada, manguera fuera.`,
  'valve-not-half-open': ({ valve, position }, say) =>
    `Para el invierno quedó ${say.position(position)}: ${say.valve(valve)}. Medio abierta (45 grados) deja salir el agua que rodea la bola.`,
  'valve-not-recorded': ({ valve }, say) => `No está anotada la posición de invierno: ${say.valve(valve)}.`,
  'valve-not-worked': ({ valve }, say) =>
    `Quedó medio abierta sin moverla antes de un lado a otro: ${say.valve(valve)}.`,
  'pump-not-drained': ({ how }) =>
    how === 'said'
      ? 'La bomba no se drenó. El agua que queda la rompe.'
      : 'Nadie anotó si la bomba se drenó.',
  'drain-left-open': ({ drain, place }, say) =>
    `Quedó abierto: ${say.drain(drain, place)}. En primavera el agua se sale por ahí.`,
  'drain-not-dry': ({ drain, place }, say) =>
    `No terminó de vaciar: ${say.drain(drain, place)}. Está tapado, o la red gotea por su llave de paso.`,
  'drain-not-recorded': ({ drain, place }, say) => `No hay nada anotado: ${say.drain(drain, place)}.`,
  'plug-not-refitted': ({ how }) =>
    how === 'said'
      ? 'La conexión de aire quedó abierta, sin su tapón.'
      : 'Nadie anotó el tapón de la conexión de aire.',
  'controller-still-on': ({ how }) =>
    how === 'said'
      ? 'El programador sigue encendido y abrirá válvulas con la helada.'
      : 'Nadie anotó si el programador está apagado.',
  'part-kept-nowhere': ({ part }, say) =>
    `Pieza retirada (${say.part(part)}), y nadie sabe decir dónde está para la primavera.`,
  'part-without-photo': ({ part }, say) =>
    `Ninguna foto muestra cómo se retiró o se desvió la pieza: ${say.part(part)}.`,
  'backflow-without-photo': () =>
    'Ninguna foto muestra la posición de invierno de las válvulas antirretorno.',
  'damage-without-photo': ({ where }) =>
    `El daño visto antes del trabajo (${where}) no tiene foto; se le puede achacar a la cuadrilla.`,
  'defect-without-photo': ({ where }) => `El defecto en "${where}" no tiene foto.`,
  'photo-used-twice': ({ visits }) =>
    `La misma foto se usó en ${visits === 1 ? 'otra visita' : `otras ${visits} visitas`}.`,
  'photo-far-from-site': ({ distanceM }, say) =>
    `Una foto dice que se tomó a ${say.distance(distanceM)} del sitio. La posición del teléfono es un dato, no una prueba.`,
  'photo-taken-earlier': ({ hours }, say) =>
    `Una foto dice que se tomó ${say.hours(hours)} antes de anotarla.`,
  'photo-from-gallery': ({ photos }) =>
    photos === 1
      ? 'Una foto viene de la galería del teléfono, no de la cámara.'
      : `${photos} fotos vienen de la galería del teléfono, no de la cámara.`,
  'correction-ignored': () =>
    'Una corrección no encaja con la anotación que nombra, así que no cambió nada. Léala, por favor.',
  'chain-broken': ({ seq }) =>
    `La anotación ${seq} de un teléfono no continúa su cadena: algo anterior se cambió o se quitó.`,
  'device-gap': ({ missing }) =>
    missing === 1
      ? 'Una anotación de un teléfono de esta visita no ha llegado.'
      : `${missing} anotaciones de un teléfono de esta visita no han llegado.`,
  'two-places-at-once': ({ person, elsewhere, minutes }, say) =>
    `${capital(say.person(person))} figura aquí y en ${elsewhere} a la misma hora, durante ${say.minutes(minutes)}.`,
  'visit-shorter-than-air': ({ visitSeconds, airSeconds }, say) =>
    `Hay ${say.time(airSeconds)} de aire anotados, pero entre la llegada y la salida solo pasaron ${say.time(Math.max(0, visitSeconds))}.`,
  'clock-set-back': ({ minutes, times }, say) =>
    `El reloj de un teléfono se atrasó hasta ${say.minutes(minutes)}${times > 1 ? `, ${times} veces` : ''}. Las horas de esta visita son dudosas; su orden no.`,
  'clock-implausible': ({ entries }) =>
    entries === 1
      ? 'Una anotación lleva una fecha imposible: el reloj del teléfono estaba mal.'
      : `${entries} anotaciones llevan una fecha imposible: el reloj del teléfono estaba mal.`,
  'clock-changed': ({ minutes }, say) =>
    `El reloj de un teléfono se cambió ${say.minutes(minutes)} durante la visita.`,
  'not-signed-off': ({ person }, say) =>
    `${capital(say.person(person))} dio aire sin tener la autorización para trabajos de soplado.`,
  'working-alone': ({ person }, say) =>
    `${capital(say.person(person))} dio aire a solas; la empresa pide dos personas.`,
};
