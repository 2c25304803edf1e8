import Typography from '@mui/material/Typography';
import { useTranslation } from 'react-i18next';
import { Caution } from '../../../components/Caution';
import { ChoiceTiles } from '../../../components/ChoiceTiles';
import { useVisitLog } from '../log/visit-log';
import { StepScreen } from './StepScreen';

const kinds = ['shutoff-closed', 'was-closed', 'street-closed'] as const;

/** Water off at the shutoff, then the pressure let out through a zone or a drain. One tap each. */
export function WaterStep({ onDone }: { onDone: () => void }) {
  const { t } = useTranslation('visit');
  const { system, state, save } = useVisitLog();
  const zones = [...system.zones].sort((one, other) => one.number - other.number);

  return (
    <StepScreen step="water-off">
      <Typography>{system.waterShutoff.place}</Typography>
      <ChoiceTiles
        label={t('water.title')}
        options={kinds.map((kind) => ({ value: kind, label: t(`water.kinds.${kind}`) }))}
        value={state.waterOff?.kind ?? null}
        onChange={(kind) => void save('water-off', { kind })}
      />
      {state.waterOff && (
        <>
          <Caution picture="water">{t('water.caution')}</Caution>
          <ChoiceTiles
            label={t('water.relief')}
            options={[
              { value: 'drain', label: t('water.reliefDrain') },
              ...zones.map((zone) => ({
                value: zone.id,
                label: t('water.zone', { number: zone.number }),
                hint: zone.name,
              })),
            ]}
            value={state.pressureRelieved ? (state.pressureRelieved.zoneId ?? 'drain') : null}
            onChange={(choice) =>
              void save('pressure-relieved', { zoneId: choice === 'drain' ? null : choice }).then(
                (saved) => saved && onDone(),
              )
            }
          />
        </>
      )}
    </StepScreen>
  );
}
