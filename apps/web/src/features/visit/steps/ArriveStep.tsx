import Stack from '@mui/material/Stack';
import Typography from '@mui/material/Typography';
import { removalMethods, type EntryBody } from '@rimeward/field-log';
import { useTranslation } from 'react-i18next';
import { ChoiceTiles, ManyTiles } from '../../../components/ChoiceTiles';
import { MainAction } from '../../../components/MainAction';
import { Stepper } from '../../../components/Stepper';
import { positionNow } from '../../../phone/photos/position';
import { useUnits } from '../../../app/units/use-units';
import { AccessNotes } from '../site/AccessNotes';
import { useDraftValue } from '../log/use-draft-value';
import { useVisitLog } from '../log/visit-log';
import { StepScreen } from './StepScreen';

type Draft = Omit<EntryBody<'arrived'>, 'position'>;

/** Arrival: who, with which compressor and hose, in which weather. Everything is proposed; one tap writes it down. */
export function ArriveStep({ onDone }: { onDone: () => void }) {
  const { t } = useTranslation('visit');
  const units = useUnits();
  const { visit, system, company, me, save } = useVisitLog();
  const [draft, setDraft, dropDraft] = useDraftValue<Draft>(`visit/${visit.id}/arrive`, {
    airTemperatureF: null,
    sky: null,
    crew: visit.assigned.map((person) => person.userId),
    compressorId: company?.compressors[0]?.id ?? null,
    hoseId: company?.hoses[0]?.id ?? null,
    removalMethod: system.removalMethod,
  });
  const people = (company?.people ?? []).filter(
    (person) => person.id === me.userId || visit.assigned.some((one) => one.userId === person.id),
  );

  async function arrive(): Promise<void> {
    const position = await positionNow();
    if (await save('arrived', { ...draft, position })) {
      await dropDraft();
      onDone();
    }
  }

  return (
    <StepScreen
      step="arrive"
      action={<MainAction onClick={() => void arrive()}>{t('arrive.save')}</MainAction>}
    >
      <AccessNotes />
      <ManyTiles
        label={t('arrive.crew')}
        options={people.map((person) => ({ value: person.id, label: person.name }))}
        value={draft.crew}
        onChange={(crew) => setDraft({ ...draft, crew })}
      />
      <ChoiceTiles
        label={t('arrive.method')}
        options={removalMethods.map((method) => ({ value: method, label: t(`arrive.methods.${method}`) }))}
        value={draft.removalMethod}
        onChange={(removalMethod) => setDraft({ ...draft, removalMethod })}
      />
      <Equipment draft={draft} onChange={setDraft} />
      <ChoiceTiles
        label={t('arrive.sky')}
        options={(['clear', 'cloudy', 'rain', 'snow'] as const).map((sky) => ({
          value: sky,
          label: t(`arrive.skies.${sky}`),
        }))}
        value={draft.sky}
        onChange={(sky) => setDraft({ ...draft, sky })}
      />
      <Stack spacing={1}>
        <Typography variant="h3">{t('arrive.temperature')}</Typography>
        <Stepper
          label={t('arrive.temperature')}
          value={draft.airTemperatureF ?? 40}
          known={draft.airTemperatureF !== null}
          display={units.temperature(draft.airTemperatureF ?? 40)}
          step={2}
          min={-60}
          max={130}
          onChange={(airTemperatureF) => setDraft({ ...draft, airTemperatureF })}
        />
      </Stack>
    </StepScreen>
  );
}

function Equipment({ draft, onChange }: { draft: Draft; onChange: (draft: Draft) => void }) {
  const { t } = useTranslation('visit');
  const units = useUnits();
  const { company } = useVisitLog();
  if (!company) return null;
  return (
    <>
      <ChoiceTiles
        label={t('arrive.compressor')}
        options={company.compressors.map((compressor) => ({
          value: compressor.id,
          label: compressor.name,
          hint: units.freeAir(compressor.freeAirCfm),
        }))}
        value={draft.compressorId}
        onChange={(compressorId) => onChange({ ...draft, compressorId })}
      />
      <ChoiceTiles
        label={t('arrive.hose')}
        options={company.hoses.map((hose) => ({
          value: hose.id,
          label: hose.name,
          hint: units.length(hose.lengthFt),
        }))}
        value={draft.hoseId}
        onChange={(hoseId) => onChange({ ...draft, hoseId })}
      />
    </>
  );
}
