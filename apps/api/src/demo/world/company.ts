import type { CompanySettings } from '@rimeward/contracts';
import { idOf } from '../chance';

/** An invented company in an invented town. */
export const demoCompany: { id: string; name: string; settings: CompanySettings } = {
  id: idOf('company'),
  name: 'Wrenfield Sprinkler Works',
  settings: {
    units: 'us',
    metricPressure: 'kPa',
    language: 'en',
    timeZone: 'America/Denver',
    pressureCapPsi: null,
    forbidsWorkingAlone: false,
  },
};

/** Middle of the town and how far its streets reach, in degrees. */
export const town = {
  name: 'Wrenfield',
  latitude: 40.214,
  longitude: -103.962,
  reach: 0.035,
  elevationFt: 4_480,
} as const;
