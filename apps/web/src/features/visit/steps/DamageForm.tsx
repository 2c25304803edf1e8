import Button from '@mui/material/Button';
import Stack from '@mui/material/Stack';
import Typography from '@mui/material/Typography';
import type { PhotoReference } from '@rimeward/field-log';
import { useForm } from 'react-hook-form';
import { useTranslation } from 'react-i18next';
import { FormTextField } from '../../../components/FormTextField';
import { useDraft } from '../log/use-draft';
import { useDraftValue } from '../log/use-draft-value';
import { useVisitLog } from '../log/visit-log';
import { VisitPhotos } from '../log/visit-photos';

const empty = { where: '', what: '' };

/** Damage seen before work begins, photographed so that nobody lays it at the crew's door. */
export function DamageForm() {
  const { t } = useTranslation('visit');
  const { visit, state, save } = useVisitLog();
  const key = `visit/${visit.id}/damage`;
  const [photos, setPhotos, dropPhotos] = useDraftValue<PhotoReference[]>(`${key}/photos`, []);
  const form = useForm({ defaultValues: empty });
  const drop = useDraft(key, form);

  const submit = form.handleSubmit(async (values) => {
    if (!(await save('damage-seen', values, photos))) return;
    form.reset(empty);
    await drop();
    await dropPhotos();
  });

  return (
    <Stack component="form" spacing={2} onSubmit={(event) => void submit(event)} noValidate>
      <Typography variant="h2">{t('walk.damage')}</Typography>
      {state.damageSeen.map((damage) => (
        <Typography key={damage.entryId}>{`${damage.where}: ${damage.what}`}</Typography>
      ))}
      <FormTextField control={form.control} name="where" label={t('walk.damageWhere')} />
      <FormTextField
        control={form.control}
        name="what"
        label={t('walk.damageWhat')}
        required={t('required')}
        multiline
      />
      <VisitPhotos
        field="damage"
        role="damage-before-work"
        label={t('walk.damage')}
        photos={photos}
        onChange={setPhotos}
      />
      <Button type="submit" variant="outlined">
        {t('walk.saveDamage')}
      </Button>
    </Stack>
  );
}
