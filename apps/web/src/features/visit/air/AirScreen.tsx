import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import Stack from '@mui/material/Stack';
import Typography from '@mui/material/Typography';
import { endSigns, zoneIsDone, type Zone } from '@rimeward/field-log';
import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import { useUnits } from '../../../app/units/use-units';
import { ChoiceTiles } from '../../../components/ChoiceTiles';
import { useVisitLog } from '../log/visit-log';
import { StepScreen } from '../steps/StepScreen';
import { AirButton } from './AirButton';
import { clockText } from '../../../app/format/clock-text';
import { capMs, restMs } from './cycle-plan';
import { GaugePad } from './GaugePad';
import { InterlockList } from './InterlockList';
import { SkipZone } from './SkipZone';
import { useAir } from './use-air';
import { useAwake } from './use-awake';
import { useNoUpdates } from '../log/use-no-updates';
import { useNow } from './use-now';
import { useSignal } from './use-signal';
import { ZonePicker } from './ZonePicker';
import { zoneOrder } from './zone-order';

/** Air, one zone at a time: it fills the display, and the control at the bottom starts and stops it, always in the same place. */
export function AirScreen({ onDone }: { onDone: () => void }) {
  const { t } = useTranslation('visit');
  const { system, state } = useVisitLog();
  const order = zoneOrder(system);
  const runningZone = state.runningCycles.at(-1)?.zoneId;
  const proposed = order.find((zone) => !zoneIsDone(state.zones[zone.id])) ?? order[0];
  const [chosen, setChosen] = useState<string | null>(null);
  const zone = order.find((one) => one.id === (runningZone ?? chosen ?? proposed?.id)) ?? proposed;

  if (!zone) {
    return (
      <StepScreen step="air">
        <Typography>{t('air.noZones')}</Typography>
      </StepScreen>
    );
  }
  return <ZoneAir key={zone.id} zone={zone} order={order} onChoose={setChosen} onDone={onDone} />;
}

interface ZoneAirProps {
  zone: Zone;
  order: Zone[];
  onChoose: (zoneId: string | null) => void;
  onDone: () => void;
}

function ZoneAir({ zone, order, onChoose, onDone }: ZoneAirProps) {
  const { t } = useTranslation('visit');
  const units = useUnits();
  const { ceilings, state } = useVisitLog();
  const now = useNow(250);
  const air = useAir(zone, now);
  const [panel, setPanel] = useState<'gauge' | 'zones' | 'skip' | null>(null);
  const running = air.running;
  const ranMs = running ? now - running.started.atMs : 0;
  const lastStop = air.cycles.filter((cycle) => cycle.stopped).at(-1)?.stopped?.atMs ?? null;
  const restLeftMs = !running && lastStop !== null ? lastStop + restMs - now : 0;
  const alarm = air.alarms[0] ?? null;
  const blocked = air.interlocks.filter(
    (lock) => !lock.satisfied && lock.passedBy === null && lock.id !== 'zone-open',
  );
  const done = zoneIsDone(state.zones[zone.id]);
  const next = order.find((one) => one.id !== zone.id && !zoneIsDone(state.zones[one.id])) ?? null;
  const ceiling = ceilings[zone.id];
  const gauge =
    (running ?? air.cycles.at(-1))?.gaugeReadings.at(-1)?.pressurePsi ?? state.regulator?.pressurePsi ?? null;
  useAwake(running !== null);
  useNoUpdates(running !== null);
  useSignal(alarm !== null, 880);
  useSignal(running !== null && ranMs >= capMs(zone.headKind) - 15_000, 660);

  function follow(): void {
    if (next) onChoose(next.id);
    else onDone();
  }

  return (
    <StepScreen
      step="air"
      action={
        <AirButton
          running={running !== null}
          disabled={!running && blocked.length > 0}
          done={done && air.unsigned === null}
          nextLabel={next ? t('air.nextZone', { number: next.number }) : t('air.finished')}
          onStart={() => void air.start()}
          onStop={() => void air.stop()}
          onNext={follow}
        />
      }
    >
      <Stack direction="row" sx={{ justifyContent: 'space-between', alignItems: 'baseline' }}>
        <Typography variant="h1">{t('air.zone', { number: zone.number })}</Typography>
        <Typography>{t('air.place', { place: order.indexOf(zone) + 1, total: order.length })}</Typography>
      </Stack>
      <Typography>{zone.name}</Typography>
      {alarm && (
        <Box role="alert" sx={{ bgcolor: 'error.main', color: 'error.contrastText', p: 2, fontWeight: 700 }}>
          {t(`air.${alarmTexts[alarm.kind]}`)}
        </Box>
      )}
      <Stack direction="row" spacing={2} sx={{ justifyContent: 'space-between' }}>
        <Reading
          label={
            running
              ? t('air.running')
              : restLeftMs > 0
                ? t('air.rest', { time: '' })
                : t('air.cycles', { count: air.cycles.length })
          }
          value={clockText(running ? ranMs : Math.max(0, restLeftMs))}
        />
        <Reading label={t('air.gauge')} value={gauge === null ? '–' : units.pressure(gauge)} />
      </Stack>
      {ceiling && (
        <Typography>
          {t('connect.ceiling', {
            pressure: units.pressure(ceiling.pressurePsi),
            setBy: ceiling.partName ?? t(`ceilingSetBy.${ceiling.setBy}`),
          })}
        </Typography>
      )}
      {air.unsigned && (
        <ChoiceTiles
          label={t('air.endSign')}
          options={endSigns.map((sign) => ({ value: sign, label: t(`air.endSigns.${sign}`) }))}
          value={null}
          onChange={(sign) => void air.sign(sign)}
        />
      )}
      {!running && !air.unsigned && blocked.length > 0 && (
        <InterlockList blocked={blocked} onPass={air.pass} />
      )}
      {done && <Typography sx={{ fontWeight: 600 }}>{t('air.zoneDone')}</Typography>}
      <Stack direction="row" spacing={2}>
        <Button variant="outlined" fullWidth onClick={() => setPanel(panel === 'gauge' ? null : 'gauge')}>
          {t('air.readGauge')}
        </Button>
        <Button
          variant="outlined"
          fullWidth
          disabled={running !== null}
          onClick={() => setPanel(panel === 'zones' ? null : 'zones')}
        >
          {t('air.chooseZone')}
        </Button>
      </Stack>
      {panel === 'gauge' && (
        <GaugePad
          onSave={(pressurePsi) => {
            setPanel(null);
            void air.readGauge(pressurePsi);
          }}
        />
      )}
      {panel === 'zones' && (
        <ZonePicker
          order={order}
          current={zone.id}
          onChoose={(id) => {
            setPanel(null);
            onChoose(id);
          }}
        />
      )}
      {!running && !done && (
        <SkipZone
          zoneId={zone.id}
          open={panel === 'skip'}
          onOpen={() => setPanel('skip')}
          onSkip={async (reason) => {
            if (await air.skip(reason)) {
              setPanel(null);
              follow();
            }
          }}
        />
      )}
    </StepScreen>
  );
}

const alarmTexts = {
  'no-open-zone': 'alarmNoZone',
  'past-cap': 'alarmTooLong',
  'after-dry': 'alarmAfterDry',
} as const;

function Reading({ label, value }: { label: string; value: string }) {
  return (
    <Box>
      <Typography>{label}</Typography>
      <Typography variant="reading" component="p" sx={{ fontSize: 52, lineHeight: 1.1 }}>
        {value}
      </Typography>
    </Box>
  );
}
