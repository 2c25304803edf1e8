import Stack from '@mui/material/Stack';
import Typography from '@mui/material/Typography';
import type { EntryBody } from '@rimeward/field-log';
import { useTranslation } from 'react-i18next';
import { useUnits } from '../../../app/units/use-units';
import { Caution } from '../../../components/Caution';
import { ChoiceTiles } from '../../../components/ChoiceTiles';
import { MainAction } from '../../../components/MainAction';
import { NumberPad } from '../../../components/NumberPad';
import { useDraftValue } from '../log/use-draft-value';
import { useVisitLog } from '../log/visit-log';
import { StepScreen } from './StepScreen';

const places = ['blow-out-fitting', 'quick-coupler', 'hose-bib', 'test-cock', 'other'] as const;
type Draft = {
  place: EntryBody<'air-connected'>['place'] | null;
  downstreamOfBackflow: boolean | null;
  couplingsPinned: boolean | null;
};

/** Where the hose joins the system, and that it cannot come off. */
export function ConnectStep({ onDone }: { onDone: () => void }) {
  const { t } = useTranslation('visit');
  const { visit, system, save } = useVisitLog();
  const [draft, setDraft, dropDraft] = useDraftValue<Draft>(`visit/${visit.id}/connect`, {
    place: system.airConnection.kind === 'unknown' ? null : system.airConnection.kind,
    downstreamOfBackflow: system.airConnection.downstreamOfBackflow,
    couplingsPinned: null,
  });
  const { place, downstreamOfBackflow, couplingsPinned } = draft;
  const complete = place !== null && downstreamOfBackflow !== null && couplingsPinned !== null;

  async function connect(): Promise<void> {
    if (!complete) return;
    if (await save('air-connected', { place, downstreamOfBackflow, couplingsPinned })) {
      await dropDraft();
      onDone();
    }
  }

  return (
    <StepScreen
      step="connect"
      action={
        <MainAction disabled={!complete} onClick={() => void connect()}>
          {t('connect.save')}
        </MainAction>
      }
    >
      <Caution picture="backflow">{t('connect.cautionThrough')}</Caution>
      <Typography>{system.airConnection.place}</Typography>
      <ChoiceTiles
        label={t('connect.place')}
        options={places.map((value) => ({ value, label: t(`connect.places.${value}`) }))}
        value={place}
        onChange={(to) => setDraft({ ...draft, place: to })}
      />
      <YesNo
        label={t('connect.downstream')}
        value={downstreamOfBackflow}
        onChange={(to) => setDraft({ ...draft, downstreamOfBackflow: to })}
      />
      <YesNo
        label={t('connect.pinned')}
        value={couplingsPinned}
        onChange={(to) => setDraft({ ...draft, couplingsPinned: to })}
      />
    </StepScreen>
  );
}

/** The regulator's setting, typed on our own pad; over the ceiling it says so before it is saved. */
export function RegulatorStep({ onDone }: { onDone: () => void }) {
  const { t } = useTranslation('visit');
  const units = useUnits();
  const { visit, lowestCeiling, save } = useVisitLog();
  const [typed, setTyped, dropTyped] = useDraftValue(`visit/${visit.id}/regulator`, '');
  const pressurePsi = typed === '' ? null : units.pressureToPsi(Number(typed));
  const over = pressurePsi !== null && lowestCeiling !== null && pressurePsi > lowestCeiling.pressurePsi;

  async function set(): Promise<void> {
    if (pressurePsi === null) return;
    if (await save('regulator-set', { pressurePsi })) {
      await dropTyped();
      onDone();
    }
  }

  return (
    <StepScreen
      step="regulator"
      action={
        <MainAction disabled={pressurePsi === null} onClick={() => void set()}>
          {t('connect.regulatorSave')}
        </MainAction>
      }
    >
      {lowestCeiling && (
        <Typography>
          {t('connect.ceiling', {
            pressure: units.pressure(lowestCeiling.pressurePsi),
            setBy: lowestCeiling.partName ?? t(`ceilingSetBy.${lowestCeiling.setBy}`),
          })}
        </Typography>
      )}
      <NumberPad label={t('connect.regulator')} unit={units.pressureUnit} value={typed} onChange={setTyped} />
      {over && lowestCeiling && (
        <Caution picture="pressure">
          {t('connect.overCeiling', { pressure: units.pressure(lowestCeiling.pressurePsi) })}
        </Caution>
      )}
    </StepScreen>
  );
}

function YesNo({
  label,
  value,
  onChange,
}: {
  label: string;
  value: boolean | null;
  onChange: (value: boolean) => void;
}) {
  const { t } = useTranslation('visit');
  return (
    <ChoiceTiles
      label={label}
      options={[
        { value: 'yes', label: t('connect.yes') },
        { value: 'no', label: t('connect.no') },
      ]}
      value={value === null ? null : value ? 'yes' : 'no'}
      onChange={(choice) => onChange(choice === 'yes')}
    />
  );
}

/** The caution card, then: nobody in the way, eyes and ears protected. */
export function PeopleClearStep({ onDone }: { onDone: () => void }) {
  const { t, i18n } = useTranslation('visit');
  const { state, save } = useVisitLog();
  const cardRead = state.cautionsRead.length > 0;

  async function go(): Promise<void> {
    const language = i18n.resolvedLanguage === 'es' ? 'es' : 'en';
    if (!cardRead && !(await save('cautions-read', { card: 'blow-out-1', language }))) return;
    if (await save('people-clear', { areaClear: true, eyesAndEars: true })) onDone();
  }

  const lines = t('cautions.lines', { returnObjects: true });
  return (
    <StepScreen
      step="people-clear"
      action={<MainAction onClick={() => void go()}>{t('connect.clearSave')}</MainAction>}
    >
      <Typography variant="h2">{t('cautions.title')}</Typography>
      {lines.map((line, index) => (
        <Caution key={line} picture={pictures[index] ?? 'people'}>
          {line}
        </Caution>
      ))}
      <Typography>{t('cautions.deference')}</Typography>
      <Stack spacing={1}>
        <Typography variant="h2">{t('connect.clearTitle')}</Typography>
        <Typography>{t('connect.clearArea')}</Typography>
        <Typography>{t('connect.clearEyes')}</Typography>
      </Stack>
    </StepScreen>
  );
}

const pictures = ['people', 'eyes-ears', 'hose', 'pressure', 'backflow', 'heat'] as const;
