import type { CompanySettings } from '@rimeward/contracts';

export interface Units {
  pressureUnit: string;
  pressure: (psi: number) => string;
  /** A figure typed in the company's pressure unit, as psi. */
  pressureToPsi: (typed: number) => number;
  freeAir: (cfm: number) => string;
  flow: (gpm: number) => string;
  volume: (gal: number) => string;
  length: (ft: number) => string;
  temperature: (fahrenheit: number) => string;
}

/** Exact by definition (NIST SP 811, 2008): 1 psi, 1 ft3, 1 US gal, 1 ft in SI. */
const kPaPerPsi = 6.894757293168;
const litresPerFt3 = 28.316846592;
const litresPerGal = 3.785411784;
const metresPerFt = 0.3048;

/** Formatting in US customary or metric units; the values inside the product are always US customary. */
export function unitsOf(settings: Pick<CompanySettings, 'units' | 'metricPressure'>, locale: string): Units {
  const text = (value: number, unit: string, digits: number): string =>
    `${new Intl.NumberFormat(locale, { maximumFractionDigits: digits, minimumFractionDigits: digits }).format(value)} ${unit}`;
  if (settings.units === 'us') {
    return {
      pressureUnit: 'psi',
      pressure: (psi) => text(psi, 'psi', 0),
      pressureToPsi: (typed) => typed,
      freeAir: (cfm) => text(cfm, 'ft³/min', 0),
      flow: (gpm) => text(gpm, 'gal/min', 1),
      volume: (gal) => text(gal, 'gal', 1),
      length: (ft) => text(ft, 'ft', 0),
      temperature: (fahrenheit) => text(fahrenheit, '°F', 0),
    };
  }
  const bar = settings.metricPressure === 'bar';
  const perPsi = bar ? kPaPerPsi / 100 : kPaPerPsi;
  return {
    pressureUnit: settings.metricPressure,
    pressure: (psi) => text(psi * perPsi, settings.metricPressure, bar ? 1 : 0),
    pressureToPsi: (typed) => typed / perPsi,
    freeAir: (cfm) => text((cfm * litresPerFt3) / 60, 'L/s', 0),
    flow: (gpm) => text((gpm * litresPerGal) / 60, 'L/s', 2),
    volume: (gal) => text(gal * litresPerGal, 'L', 0),
    length: (ft) => text(ft * metresPerFt, 'm', 1),
    temperature: (fahrenheit) => text(((fahrenheit - 32) * 5) / 9, '°C', 0),
  };
}
