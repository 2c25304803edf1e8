import { useLiveQuery } from 'dexie-react-hooks';
import { useEffect, useMemo, type ReactNode } from 'react';
import { offerLanguage } from '../../app/i18n/i18n';
import { UnitSettingsContext } from '../../app/units/use-units';
import { startDelivery } from '../../phone/delivery/runner';
import { activeEnrolment } from '../../phone/device/enrolment';
import { readSession } from './session-api';
import { SessionContext } from './session-context';

const usUnits = { units: 'us', metricPressure: 'kPa' } as const;

/** Knows from this phone who works here, keeps names and settings fresh when there is a signal, and starts the delivery. */
export function SessionProvider({ children }: { children: ReactNode }) {
  const enrolment = useLiveQuery(() => activeEnrolment(), []);
  const deviceId = enrolment?.deviceId ?? null;
  const language = enrolment?.user.language ?? null;

  useEffect(() => {
    if (deviceId === null) return;
    void readSession();
    return startDelivery();
  }, [deviceId]);
  useEffect(() => {
    if (language !== null) void offerLanguage(language);
  }, [language]);

  const state = useMemo(() => ({ enrolment: enrolment ?? null }), [enrolment]);
  if (enrolment === undefined) return null;
  return (
    <SessionContext.Provider value={state}>
      <UnitSettingsContext.Provider value={enrolment?.company.settings ?? usUnits}>
        {children}
      </UnitSettingsContext.Provider>
    </SessionContext.Provider>
  );
}
