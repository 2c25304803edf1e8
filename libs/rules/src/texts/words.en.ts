import type { Words } from './say';

const seconds = (value: number): string => {
  const whole = Math.round(value);
  if (whole < 60) return `${whole} s`;
  const rest = whole % 60;
  const minutes = Math.floor(whole / 60);
  return rest === 0 ? `${minutes} min` : `${minutes} min ${rest} s`;
};

export const wordsEn: Words = {
  seconds,
  minutes: (value) => (value < 120 ? `${value} min` : `${Math.round(value / 60)} h`),
  hours: (value) => (value < 72 ? `${value} h` : `${Math.round(value / 24)} days`),
  decimal: '.',
  somebody: 'somebody on the crew',
  unnamedZone: 'a zone that is not on record',
  zone: (number, name) =>
    name === '' || name === `Zone ${number}` ? `zone ${number}` : `zone ${number} (${name})`,
  valve: (role, number) =>
    ({
      shutoff: `shutoff ${number} of the backflow assembly`,
      'test-cock': `test cock ${number}`,
      'vent-screw': 'the vent screw',
    })[role],
  parts: {
    'flow-sensor': 'flow sensor',
    'flow-meter': 'flow meter',
    submeter: 'submeter',
    pump: 'pump',
    'pressure-regulator': 'pressure regulator',
    filter: 'filter',
  },
  drains: { upstream: 'upstream drain', manual: 'manual drain', automatic: 'automatic drain' },
  ceilings: {
    'rigid-pvc': 'rigid pipe',
    polyethylene: 'polyethylene pipe',
    unknown: 'pipe that nobody knows, so the lower limit holds',
    'lowest-part': 'the weakest part of the zone',
    'pipe-rating': 'the class of the pipe',
    'company-cap': 'the company',
  },
  positions: { closed: 'closed', 'half-open': 'half open', open: 'open', other: 'in another position' },
  signs: { water: 'water', spitting: 'spitting', mist: 'mist', dry: 'dry air' },
  locks: {
    'water-off': 'water off',
    'pressure-relieved': 'pressure relieved',
    'sensitive-parts': 'sensitive parts out of the way',
    'backflow-closed': 'backflow shutoffs closed',
    'connection-downstream': 'hose downstream of the backflow assembly',
    'couplings-pinned': 'hose couplings pinned',
    'regulator-under-ceiling': 'regulator under the ceiling',
    'zone-open': 'a zone open',
    'cautions-read': 'caution card read',
    'people-clear': 'people clear',
  },
  whys: {
    'no-access': 'no access',
    'no-shutoff': 'the water shutoff was not found',
    'broken-pipe': 'a broken pipe',
    weather: 'the weather',
    other: 'another reason',
  },
};
