import Button from '@mui/material/Button';
import Typography from '@mui/material/Typography';
import { sensitivePartKinds, type SensitivePartKind } from '@rimeward/field-log';
import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import { v7 as uuidv7 } from 'uuid';
import { ChoiceTiles } from '../../../components/ChoiceTiles';
import { MainAction } from '../../../components/MainAction';
import { useVisitLog } from '../log/visit-log';
import { DamageForm } from './DamageForm';
import { PartCard } from './PartCard';
import { StepScreen } from './StepScreen';

interface ShownPart {
  partId: string;
  kind: SensitivePartKind;
  place: string;
}

/** Every part that air must not reach: looked for, protected, photographed; and what was broken before work began. */
export function WalkThroughStep({ onDone }: { onDone: () => void }) {
  const { t } = useTranslation('visit');
  const { system, state, save } = useVisitLog();
  const [adding, setAdding] = useState(false);

  const known: ShownPart[] = system.sensitiveParts.map((part) => ({ ...part, partId: part.id }));
  const foundHere: ShownPart[] = Object.values(state.parts)
    .filter((part) => !known.some((one) => one.partId === part.partId))
    .map((part) => ({ partId: part.partId, kind: part.kind, place: '' }));
  const parts = [...known, ...foundHere];

  return (
    <StepScreen step="walk-through" action={<MainAction onClick={onDone}>{t('walk.finished')}</MainAction>}>
      <Typography>{parts.length > 0 ? t('walk.intro') : t('walk.nothingKnown')}</Typography>
      {parts.map((part) => (
        <PartCard key={part.partId} {...part} />
      ))}
      {adding ? (
        <ChoiceTiles
          label={t('walk.addPart')}
          options={sensitivePartKinds.map((kind) => ({ value: kind, label: t(`walk.kinds.${kind}`) }))}
          value={null}
          onChange={(kind) => {
            setAdding(false);
            void save('part-looked-for', { partId: uuidv7(), kind, outcome: 'found' });
          }}
        />
      ) : (
        <Button variant="outlined" fullWidth onClick={() => setAdding(true)}>
          {t('walk.addPart')}
        </Button>
      )}
      <DamageForm />
    </StepScreen>
  );
}
