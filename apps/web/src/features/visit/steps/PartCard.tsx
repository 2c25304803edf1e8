import Button from '@mui/material/Button';
import Stack from '@mui/material/Stack';
import Typography from '@mui/material/Typography';
import type { EntryBody, PhotoReference, SensitivePartKind } from '@rimeward/field-log';
import { useForm } from 'react-hook-form';
import { useTranslation } from 'react-i18next';
import { ChoiceTiles } from '../../../components/ChoiceTiles';
import { FormTextField } from '../../../components/FormTextField';
import { useDraftValue } from '../log/use-draft-value';
import { useDraft } from '../log/use-draft';
import { useVisitLog } from '../log/visit-log';
import { VisitPhotos } from '../log/visit-photos';

const outcomes = ['found', 'none', 'not-found'] as const;
const hows = ['removed-blank', 'removed-spool', 'bypassed', 'left'] as const;
const keptPlaces = ['truck', 'controller', 'customer', 'on-site', 'nowhere'] as const;

type How = EntryBody<'part-protected'>['how'];

interface Props {
  partId: string;
  kind: SensitivePartKind;
  place: string;
}

/** One sensitive part: is it there, what was done with it, where it is kept, and the picture that proves it. */
export function PartCard({ partId, kind, place }: Props) {
  const { t } = useTranslation('visit');
  const { visit, state, save } = useVisitLog();
  const part = state.parts[partId];
  const key = `visit/${visit.id}/part/${partId}`;
  const [photos, setPhotos, dropPhotos] = useDraftValue<PhotoReference[]>(`${key}/photos`, []);
  const [how, setHow, dropHow] = useDraftValue<How | null>(`${key}/how`, null);

  async function protect(kept: EntryBody<'part-protected'>['keptWhere'], reason?: string): Promise<void> {
    if (!how) return;
    const body = { partId, kind, how, keptWhere: kept, ...(reason ? { reason } : {}) };
    if (await save('part-protected', body, photos)) {
      await dropPhotos();
      await dropHow();
    }
  }

  return (
    <Stack spacing={2} sx={{ borderTop: 2, borderColor: 'divider', pt: 2 }}>
      <Typography variant="h2">{t(`walk.kinds.${kind}`)}</Typography>
      {place && <Typography>{place}</Typography>}
      <ChoiceTiles
        label={t('walk.outcome')}
        options={outcomes.map((value) => ({ value, label: t(`walk.outcomes.${value}`) }))}
        value={part?.outcome ?? null}
        onChange={(outcome) => void save('part-looked-for', { partId, kind, outcome })}
      />
      {part?.outcome === 'found' && !part.protection && (
        <>
          <VisitPhotos
            field={`part/${partId}`}
            role="sensitive-part"
            label={t('walk.photo')}
            photos={photos}
            onChange={setPhotos}
          />
          <ChoiceTiles
            label={t('walk.how')}
            options={hows.map((value) => ({ value, label: t(`walk.hows.${value}`) }))}
            value={how}
            onChange={setHow}
          />
          {(how === 'removed-blank' || how === 'removed-spool') && (
            <ChoiceTiles
              label={t('walk.kept')}
              options={keptPlaces.map((value) => ({ value, label: t(`walk.keptPlaces.${value}`) }))}
              value={null}
              onChange={(kept) => void protect(kept)}
            />
          )}
          {how === 'bypassed' && (
            <Button variant="contained" onClick={() => void protect(null)}>
              {t('walk.hows.bypassed')}
            </Button>
          )}
          {how === 'left' && (
            <ReasonForm draftKey={`${key}/reason`} onSave={(reason) => protect(null, reason)} />
          )}
        </>
      )}
      {part?.protection && (
        <Typography>
          {t(`walk.hows.${part.protection.how}`)}
          {part.protection.keptWhere ? ` · ${t(`walk.keptPlaces.${part.protection.keptWhere}`)}` : ''}
        </Typography>
      )}
    </Stack>
  );
}

function ReasonForm({ draftKey, onSave }: { draftKey: string; onSave: (reason: string) => Promise<void> }) {
  const { t } = useTranslation('visit');
  const form = useForm({ defaultValues: { reason: '' } });
  const drop = useDraft(draftKey, form);
  return (
    <form
      onSubmit={(event) =>
        void form.handleSubmit(async ({ reason }) => {
          await onSave(reason);
          await drop();
        })(event)
      }
    >
      <Stack spacing={2}>
        <FormTextField
          control={form.control}
          name="reason"
          label={t('walk.reason')}
          required={t('required')}
        />
        <Button type="submit" variant="contained">
          {t('walk.hows.left')}
        </Button>
      </Stack>
    </form>
  );
}
