import Typography from '@mui/material/Typography';
import type { Drain } from '@rimeward/field-log';
import { useTranslation } from 'react-i18next';
import { Caution } from '../../../components/Caution';
import { ChoiceTiles, ManyTiles } from '../../../components/ChoiceTiles';
import { MainAction } from '../../../components/MainAction';
import { useVisitLog } from '../log/visit-log';
import { StepScreen } from './StepScreen';

const controllerModes = ['off', 'rain', 'still-on'] as const;
const insulation = ['backflow', 'pump', 'pipe'] as const;

/** What stays for the winter besides the backflow valves: drains, pump, plug, controller, insulation. */
export function WinterStep({
  step,
  onDone,
}: {
  step: 'drains' | 'pump' | 'plug' | 'controller';
  onDone: () => void;
}) {
  const { t } = useTranslation('visit');
  const { system, state, save } = useVisitLog();
  const insulated = state.insulated.map((said) => said.what);

  return (
    <StepScreen step={step} action={<MainAction onClick={onDone}>{t('visit.stepDone')}</MainAction>}>
      {system.drains.length === 0 && <Typography>{t('winter.noDrains')}</Typography>}
      {system.drains.map((drain) => (
        <DrainTiles key={drain.id} drain={drain} />
      ))}
      {system.pump && (
        <>
          <Caution picture="pump">{t('winter.pumpCaution')}</Caution>
          <ChoiceTiles
            label={`${t('stepNames.pump')} · ${system.pump.place}`}
            options={[
              { value: 'yes', label: t('winter.pumpDrained') },
              { value: 'no', label: t('winter.pumpNot') },
            ]}
            value={state.pump ? (state.pump.drained ? 'yes' : 'no') : null}
            onChange={(choice) =>
              system.pump && void save('pump-drained', { pumpId: system.pump.id, drained: choice === 'yes' })
            }
          />
        </>
      )}
      <ChoiceTiles
        label={`${t('stepNames.plug')} · ${system.airConnection.place}`}
        options={[
          { value: 'yes', label: t('winter.plugged') },
          { value: 'no', label: t('winter.notPlugged') },
        ]}
        value={state.plug ? (state.plug.plugged ? 'yes' : 'no') : null}
        onChange={(choice) => void save('connection-plugged', { plugged: choice === 'yes' })}
      />
      <ChoiceTiles
        label={`${t('stepNames.controller')} · ${system.controller.place}`}
        options={controllerModes.map((mode) => ({ value: mode, label: t(`winter.controllerModes.${mode}`) }))}
        value={state.controller?.mode ?? null}
        onChange={(mode) => void save('controller-set', { mode })}
      />
      <ManyTiles
        label={t('winter.insulated')}
        options={insulation.map((what) => ({ value: what, label: t(`winter.insulation.${what}`) }))}
        value={insulated}
        onChange={(chosen) => {
          const added = chosen.find((what) => !insulated.includes(what));
          if (added) void save('insulated', { what: added });
        }}
      />
    </StepScreen>
  );
}

function DrainTiles({ drain }: { drain: Drain }) {
  const { t } = useTranslation('visit');
  const { state, save } = useVisitLog();
  const said = state.drains[drain.id];
  return (
    <ChoiceTiles
      label={`${t(`winter.${drain.kind}`)} · ${drain.place}`}
      options={[
        { value: 'closed', label: t('winter.ranDryClosed') },
        { value: 'open', label: t('winter.leftOpen') },
      ]}
      value={said?.position ?? null}
      onChange={(position) => void save('drain-set', { drainId: drain.id, ranDry: true, position })}
    />
  );
}
