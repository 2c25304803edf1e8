import type { Words } from './say';

const seconds = (value: number): string => {
  const whole = Math.round(value);
  if (whole < 60) return `${whole} s`;
  const rest = whole % 60;
  const minutes = Math.floor(whole / 60);
  return rest === 0 ? `${minutes} min` : `${minutes} min ${rest} s`;
};

/** Spanish as the crews speak it in the United States: decimal point, formal address. */
export const wordsEs: Words = {
  seconds,
  minutes: (value) => (value < 120 ? `${value} min` : `${Math.round(value / 60)} h`),
  hours: (value) => (value < 72 ? `${value} h` : `${Math.round(value / 24)} días`),
  decimal: '.',
  somebody: 'alguien de la cuadrilla',
  unnamedZone: 'una zona que no está registrada',
  zone: (number, name) =>
    name === '' || name === `Zona ${number}` ? `la zona ${number}` : `la zona ${number} (${name})`,
  valve: (role, number) =>
    ({
      shutoff: `la válvula de cierre ${number} del antirretorno`,
      'test-cock': `la llave de prueba ${number}`,
      'vent-screw': 'el tornillo de purga',
    })[role],
  parts: {
    'flow-sensor': 'sensor de caudal',
    'flow-meter': 'caudalímetro',
    submeter: 'medidor secundario',
    pump: 'bomba',
    'pressure-regulator': 'regulador de presión',
    filter: 'filtro',
  },
  drains: { upstream: 'drenaje de entrada', manual: 'drenaje manual', automatic: 'drenaje automático' },
  ceilings: {
    'rigid-pvc': 'el tubo rígido',
    polyethylene: 'el tubo de polietileno',
    unknown: 'un tubo que nadie conoce, así que vale el tope más bajo',
    'lowest-part': 'la pieza más débil de la zona',
    'pipe-rating': 'la clase del tubo',
    'company-cap': 'la empresa',
  },
  positions: { closed: 'cerrada', 'half-open': 'medio abierta', open: 'abierta', other: 'en otra posición' },
  signs: { water: 'agua', spitting: 'agua a golpes', mist: 'neblina', dry: 'aire seco' },
  locks: {
    'water-off': 'agua cortada',
    'pressure-relieved': 'presión suelta',
    'sensitive-parts': 'piezas delicadas fuera del paso',
    'backflow-closed': 'válvulas antirretorno cerradas',
    'connection-downstream': 'manguera después del antirretorno',
    'couplings-pinned': 'acoples de la manguera con pasador',
    'regulator-under-ceiling': 'regulador bajo el tope',
    'zone-open': 'una zona abierta',
    'cautions-read': 'tarjeta de precauciones leída',
    'people-clear': 'personas a salvo',
  },
  whys: {
    'no-access': 'sin acceso',
    'no-shutoff': 'no se halló la llave de paso',
    'broken-pipe': 'un tubo roto',
    weather: 'el mal tiempo',
    other: 'otro motivo',
  },
};
