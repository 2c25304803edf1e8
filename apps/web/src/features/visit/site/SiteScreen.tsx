import Box from '@mui/material/Box';
import Typography from '@mui/material/Typography';
import type { ReactNode } from 'react';
import { useTranslation } from 'react-i18next';
import { useDates } from '../../../app/i18n/use-dates';
import { useUnits } from '../../../app/units/use-units';
import { PhoneScreen } from '../../../components/PhoneScreen';
import { zoneOrder } from '../air/zone-order';
import { useVisitLog } from '../log/visit-log';
import { AccessNotes } from './AccessNotes';

/** The system as last known and what was noted last year, all from this phone. Unknown figures say so. */
export function SiteScreen() {
  const { t } = useTranslation('visit');
  const dates = useDates();
  const { visit, system } = useVisitLog();
  return (
    <PhoneScreen title={visit.site.name} subtitle={visit.site.address} back={`/visit/${visit.id}`}>
      <AccessNotes />
      <Fact name={t('site.customer')}>
        {[visit.customer.name, visit.customer.phone].filter(Boolean).join(' · ')}
      </Fact>
      <Fact name={t('site.method')}>{t(`arrive.methods.${system.removalMethod}`)}</Fact>
      <Fact name={t('site.connectionPoint')}>{system.pointOfConnection.place}</Fact>
      <Fact name={t('site.shutoff')}>{system.waterShutoff.place}</Fact>
      <Fact name={t('site.backflow')}>
        {`${t(`site.backflowKinds.${system.backflow.kind}`)} · ${system.backflow.place}`}
      </Fact>
      <Fact name={t('site.airConnection')}>{system.airConnection.place}</Fact>
      <Fact name={t('site.controller')}>{system.controller.place}</Fact>
      {system.sensitiveParts.length > 0 && (
        <Fact name={t('site.parts')}>
          {system.sensitiveParts.map((part) => `${t(`walk.kinds.${part.kind}`)} (${part.place})`).join(', ')}
        </Fact>
      )}
      <Typography variant="h2">{t('site.zones')}</Typography>
      <Zones />
      {visit.lastYear && (
        <Box>
          <Typography variant="h2">{t('site.lastYear')}</Typography>
          <Typography>{`${dates.day(visit.lastYear.date)} · ${visit.lastYear.technicians.join(', ')}`}</Typography>
          {[...visit.lastYear.notes, ...visit.lastYear.partsTakenOut].map((line) => (
            <Typography key={line}>{line}</Typography>
          ))}
        </Box>
      )}
    </PhoneScreen>
  );
}

function Zones() {
  const { t } = useTranslation('visit');
  const units = useUnits();
  const { system, ceilings } = useVisitLog();
  if (system.zones.length === 0) return <Typography>{t('air.noZones')}</Typography>;
  return (
    <Box component="ol" sx={{ listStyle: 'none', p: 0, m: 0 }}>
      {zoneOrder(system).map((zone) => (
        <Box component="li" key={zone.id} sx={{ borderTop: 1, borderColor: 'divider', py: 1.5 }}>
          <Typography
            sx={{ fontWeight: 600 }}
          >{`${t('air.zone', { number: zone.number })} · ${zone.name}`}</Typography>
          <Typography>
            {[
              t(`site.headKinds.${zone.headKind}`),
              zone.flowGpm === null ? t('site.flowUnknown') : units.flow(zone.flowGpm),
              zone.elevationFt === null ? t('site.heightUnknown') : units.length(zone.elevationFt),
              ceilings[zone.id] ? `≤ ${units.pressure(ceilings[zone.id]!.pressurePsi)}` : null,
            ]
              .filter(Boolean)
              .join(' · ')}
          </Typography>
        </Box>
      ))}
    </Box>
  );
}

function Fact({ name, children }: { name: string; children: ReactNode }) {
  const { t } = useTranslation('visit');
  return (
    <Box>
      <Typography variant="body2">{name}</Typography>
      <Typography sx={{ fontWeight: 600 }}>{children || t('site.unknown')}</Typography>
    </Box>
  );
}
