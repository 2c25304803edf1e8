import Button from '@mui/material/Button';
import Divider from '@mui/material/Divider';
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
import { StepScreen } from './StepScreen';

/** Defects with their photographs and recommended repairs, and notes of any kind. Reached from everywhere in the visit. */
export function DefectsStep() {
  return (
    <StepScreen step="defects">
      <DefectForm />
      <Divider />
      <NoteForm />
    </StepScreen>
  );
}

const emptyDefect = { where: '', what: '', recommended: '' };

function DefectForm() {
  const { t } = useTranslation('visit');
  const { visit, state, save } = useVisitLog();
  const key = `visit/${visit.id}/defect`;
  const [photos, setPhotos, dropPhotos] = useDraftValue<PhotoReference[]>(`${key}/photos`, []);
  const form = useForm({ defaultValues: emptyDefect });
  const drop = useDraft(key, form);

  const submit = form.handleSubmit(async ({ where, what, recommended }) => {
    const body = { zoneId: null, where, what, ...(recommended ? { recommended } : {}) };
    if (!(await save('defect-found', body, photos))) return;
    form.reset(emptyDefect);
    await drop();
    await dropPhotos();
  });

  return (
    <Stack component="form" spacing={2} onSubmit={(event) => void submit(event)} noValidate>
      {state.defects.map((defect) => (
        <Typography key={defect.entryId}>{`${defect.where}: ${defect.what}`}</Typography>
      ))}
      <FormTextField control={form.control} name="where" label={t('defects.where')} />
      <FormTextField
        control={form.control}
        name="what"
        label={t('defects.what')}
        required={t('required')}
        multiline
      />
      <FormTextField control={form.control} name="recommended" label={t('defects.recommended')} multiline />
      <VisitPhotos
        field="defect"
        role="defect"
        label={t('defects.photo')}
        photos={photos}
        onChange={setPhotos}
      />
      <Button type="submit" variant="contained">
        {t('defects.save')}
      </Button>
    </Stack>
  );
}

function NoteForm() {
  const { t } = useTranslation('visit');
  const { visit, state, save } = useVisitLog();
  const key = `visit/${visit.id}/note`;
  const form = useForm({ defaultValues: { text: '' } });
  const drop = useDraft(key, form);

  const submit = form.handleSubmit(async (values) => {
    if (!(await save('note-written', values))) return;
    form.reset({ text: '' });
    await drop();
  });

  return (
    <Stack component="form" spacing={2} onSubmit={(event) => void submit(event)} noValidate>
      {state.notes.map((note) => (
        <Typography key={note.entryId}>{note.text}</Typography>
      ))}
      <FormTextField
        control={form.control}
        name="text"
        label={t('defects.note')}
        required={t('required')}
        multiline
      />
      <Button type="submit" variant="outlined">
        {t('defects.saveNote')}
      </Button>
    </Stack>
  );
}
