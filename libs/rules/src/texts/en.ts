import type { RuleTexts } from './rule-texts';

const capital = (text: string): string => text.charAt(0).toUpperCase() + text.slice(1);
const because = (reason: string): string =>
  reason === '' ? 'No reason was written.' : `Reason given: ${reason}`;

/** Sentences of the findings, English. */
export const en: RuleTexts = {
  'people-not-clear': ({ how }) =>
    how === 'never'
      ? 'Air went on and nobody had confirmed that people stood clear with eyes and ears protected. Air throws parts, stones and water.'
      : 'People were confirmed clear only after the first air. Air throws parts, stones and water from the first moment.',
  'couplings-not-pinned': () =>
    'Air ran through a hose whose couplings were not pinned. A coupling that lets go whips.',
  'cautions-not-read': () => 'The caution card had not been read on this visit before the first air.',
  'interlock-passed': ({ interlock, reason }, say) =>
    `Went on without "${say.lock(interlock)}". ${because(reason)}`,
  'air-before-water-off': ({ how, ...zone }, say) =>
    how === 'never'
      ? `Air went on in ${say.zone(zone)} and the water was never recorded as off. Air and water can be driven back into the supply.`
      : `Air went on in ${say.zone(zone)} before the water was off. Air and water can be driven back into the supply.`,
  'air-before-relief': ({ how, ...zone }, say) =>
    how === 'never'
      ? `Air went on in ${say.zone(zone)} and the pressure in the pipe was never recorded as relieved. Both pressures act together.`
      : `Air went on in ${say.zone(zone)} before the pressure in the pipe was relieved. Both pressures act together.`,
  'air-before-sensitive-part': ({ part }, say) =>
    `The ${say.part(part)} was protected only after the first air. Air at speed breaks it.`,
  'sensitive-part-left': ({ part, reason }, say) =>
    `The ${say.part(part)} was left in place while air was on. ${because(reason)}`,
  'sensitive-part-unknown': ({ part, how }, say) =>
    ({
      'not-looked-for': `Air was on and nobody recorded looking for the ${say.part(part)} that is on record.`,
      'not-found': `The ${say.part(part)} was not found, and air was on. It may have been in the way.`,
      'not-protected': `The ${say.part(part)} was found, and air was on without it being removed or bypassed.`,
    })[how],
  'air-through-backflow': () =>
    'Air entered where it passes the backflow assembly. That breaks its parts, and it leads to the drinking water.',
  'air-with-backflow-open': ({ valve, how }, say) =>
    how === 'open'
      ? `${capital(say.valve(valve))} was not closed when the first air went on.`
      : `${capital(say.valve(valve))} was not recorded before the first air.`,
  'connection-not-recorded': () => 'Air was on and nobody recorded where the hose joined the system.',
  'no-zone-open': (zone, say) =>
    `The last open zone, ${say.zone(zone)}, was closed while air was on. A closed system takes the full pressure.`,
  'over-ceiling': ({ pressurePsi, ceilingPsi, overPsi, airSeconds, setBy, ...zone }, say) =>
    `The gauge read ${say.pressure(pressurePsi)} in ${say.zone(zone)}, ${say.pressure(overPsi)} over its ceiling of ${say.pressure(ceilingPsi)} set by ${say.ceiling(setBy)}` +
    (airSeconds > 0 ? `, in cycles of ${say.time(airSeconds)} together.` : '.'),
  'regulator-over-ceiling': ({ pressurePsi, ceilingPsi, setBy, ...zone }, say) =>
    `The regulator stood at ${say.pressure(pressurePsi)} when air went into ${say.zone(zone)}, whose ceiling is ${say.pressure(ceilingPsi)}, set by ${say.ceiling(setBy)}.`,
  'regulator-not-recorded': () => 'The regulator was not recorded before the first air.',
  'no-gauge-reading': (zone, say) =>
    `No gauge was read in ${say.zone(zone)}, so nobody can tell which pressure it saw.`,
  'visit-cut-short': ({ why, zonesLeft }, say) =>
    `The visit was cut short: ${say.why(why)}. ${zonesLeft === 1 ? 'One zone still holds' : `${zonesLeft} zones still hold`} water; somebody has to come back before the frost.`,
  'zone-without-air': (zone, say) =>
    `${capital(say.zone(zone))} got no air and nobody said why. Its water is still in the ground.`,
  'zone-skipped': ({ reason, ...zone }, say) =>
    `${capital(say.zone(zone))} was skipped, so its water is still in the ground. ${because(reason)}`,
  'too-few-cycles': ({ cycles, wanted, ...zone }, say) =>
    `${capital(say.zone(zone))} had ${cycles === 1 ? 'one air cycle' : `${cycles} air cycles`}, ${wanted} are needed: between them water runs together in the low spots.`,
  'never-dry': ({ sign, ...zone }, say) =>
    `${capital(say.zone(zone))} never came to mist: ${say.sign(sign)} was the last thing seen at the heads. Water is left in it.`,
  'end-sign-missing': (zone, say) =>
    `Nobody recorded what left the heads of ${say.zone(zone)} when its air ended.`,
  'air-unattended': ({ seconds, ...zone }, say) =>
    `Air stayed on in ${say.zone(zone)} for ${say.time(seconds)}. Nobody can have stood by.`,
  'cycle-too-long': ({ seconds, capSeconds, ...zone }, say) =>
    `A cycle of ${say.zone(zone)} ran ${say.time(seconds)}, its heads stand ${say.time(capSeconds)}. Without water they run hot.`,
  'air-after-dry': ({ seconds, ...zone }, say) =>
    `Air went on again in ${say.zone(zone)} after it was dry, for ${say.time(seconds)}. Without water the heads run hot.`,
  'tank-burst-pattern': ({ cycles, seconds, ...zone }, say) =>
    `${capital(say.zone(zone))} got ${cycles} bursts of about ${say.time(seconds)}. Letting a tank go in bursts leaves water and shocks the pipe.`,
  'rest-too-short': ({ seconds, wantedSeconds, ...zone }, say) =>
    `${capital(say.zone(zone))} rested ${say.time(seconds)} between two cycles instead of ${say.time(wantedSeconds)}.`,
  'air-against-water': ({ airSeconds, expectedSeconds, how, ...zone }, say) =>
    how === 'too-little'
      ? `${capital(say.zone(zone))} got ${say.time(airSeconds)} of air; the water in its pipe calls for about ${say.time(expectedSeconds)}.`
      : `${capital(say.zone(zone))} got ${say.time(airSeconds)} of air; about ${say.time(expectedSeconds)} would have emptied it. Something may be blocked or broken.`,
  'order-against-plan': ({ plannedPlace, place, ...zone }, say) =>
    `${capital(say.zone(zone))} was blown out in place ${place}; the plan has it in place ${plannedPlace}.`,
  'compressor-too-small': ({ compressor }) =>
    `${compressor} delivers less air than this system asks for. Air then rides over the water instead of pushing it out.`,
  'compressor-not-recorded': () => 'Nobody recorded which compressor gave the air.',
  'air-never-stopped': (zone, say) =>
    `A cycle of ${say.zone(zone)} was never recorded as stopped, so its air time is not known.`,
  'stop-without-start': () => 'Air was recorded as stopped in a cycle that has no start.',
  'hose-off-under-pressure': () => 'The hose came off before it was bled. A coupling under pressure whips.',
  'close-down-incomplete': ({ steps }) =>
    `Only ${steps} of 3 steps are recorded for closing down the air: compressor off, hose bled, hose off.`,
  'valve-not-half-open': ({ valve, position }, say) =>
    `${capital(say.valve(valve))} was left ${say.position(position)} for the winter. Half open (45 degrees) lets the water out from round its ball.`,
  'valve-not-recorded': ({ valve }, say) => `The winter position of ${say.valve(valve)} is not recorded.`,
  'valve-not-worked': ({ valve }, say) =>
    `${capital(say.valve(valve))} was not worked back and forth before it was left half open.`,
  'pump-not-drained': ({ how }) =>
    how === 'said'
      ? 'The pump was not drained. Water left in it breaks it.'
      : 'Nobody recorded whether the pump was drained.',
  'drain-left-open': ({ drain, place }, say) =>
    `The ${say.drain(drain, place)} was left open. In spring the water runs out of it.`,
  'drain-not-dry': ({ drain, place }, say) =>
    `The ${say.drain(drain, place)} did not run dry. It is blocked, or the supply leaks past its shutoff.`,
  'drain-not-recorded': ({ drain, place }, say) => `Nothing is recorded of the ${say.drain(drain, place)}.`,
  'plug-not-refitted': ({ how }) =>
    how === 'said'
      ? 'The air connection was left open, without its plug.'
      : 'Nobody recorded the plug of the air connection.',
  'controller-still-on': ({ how }) =>
    how === 'said'
      ? 'The controller is still on and will open valves in the frost.'
      : 'Nobody recorded whether the controller is off.',
  'part-kept-nowhere': ({ part }, say) =>
    `The ${say.part(part)} was taken out and nobody can say where it lies for the spring.`,
  'part-without-photo': ({ part }, say) =>
    `No photograph shows how the ${say.part(part)} was removed or bypassed.`,
  'backflow-without-photo': () => 'No photograph shows the winter position of the backflow valves.',
  'damage-without-photo': ({ where }) =>
    `The damage seen before work began (${where}) has no photograph, so it can be blamed on the crew.`,
  'defect-without-photo': ({ where }) => `The defect at "${where}" has no photograph.`,
  'photo-used-twice': ({ visits }) =>
    `The very same photograph was used on ${visits === 1 ? 'another visit' : `${visits} other visits`}.`,
  'photo-far-from-site': ({ distanceM }, say) =>
    `A photograph says it was taken ${say.distance(distanceM)} from the site. The phone's position is a claim, not a proof.`,
  'photo-taken-earlier': ({ hours }, say) =>
    `A photograph says it was taken ${say.hours(hours)} before it was logged.`,
  'photo-from-gallery': ({ photos }) =>
    `${photos === 1 ? 'One photograph' : `${photos} photographs`} came from the phone's gallery, not from its camera.`,
  'correction-ignored': () =>
    'A correction does not fit the entry that it names, so it changed nothing. Please read it.',
  'chain-broken': ({ seq }) =>
    `Entry ${seq} of a phone does not continue its chain: something before it was changed or taken away.`,
  'device-gap': ({ missing }) =>
    `${missing === 1 ? 'One entry' : `${missing} entries`} of a phone of this visit ${missing === 1 ? 'has' : 'have'} not arrived.`,
  'two-places-at-once': ({ person, elsewhere, minutes }, say) =>
    `${capital(say.person(person))} was logged here and at ${elsewhere} at the same time, for ${say.minutes(minutes)}.`,
  'visit-shorter-than-air': ({ visitSeconds, airSeconds }, say) =>
    `${say.time(airSeconds)} of air are logged, but only ${say.time(Math.max(0, visitSeconds))} lie between arriving and leaving.`,
  'clock-set-back': ({ minutes, times }, say) =>
    `The clock of a phone went back by up to ${say.minutes(minutes)}${times > 1 ? `, ${times} times` : ''}. Times of this visit are in doubt; its order is not.`,
  'clock-implausible': ({ entries }) =>
    `${entries === 1 ? 'One entry bears' : `${entries} entries bear`} an impossible date: the clock of the phone stood wrong.`,
  'clock-changed': ({ minutes }, say) =>
    `The clock of a phone was changed by ${say.minutes(minutes)} during the visit.`,
  'not-signed-off': ({ person }, say) =>
    `${capital(say.person(person))} gave air and is not signed off for blow-out work.`,
  'working-alone': ({ person }, say) =>
    `${capital(say.person(person))} gave air alone; the company asks for two.`,
};
