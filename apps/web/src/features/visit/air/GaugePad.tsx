import Button from '@mui/material/Button';
import Stack from '@mui/material/Stack';
import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import { useUnits } from '../../../app/units/use-units';
import { NumberPad } from '../../../components/NumberPad';

/** A gauge reading on our own pad, in the company's unit. */
export function GaugePad({ onSave }: { onSave: (pressurePsi: number) => void }) {
  const { t } = useTranslation('visit');
  const units = useUnits();
  const [typed, setTyped] = useState('');
  return (
    <Stack spacing={2}>
      <NumberPad label={t('air.gauge')} unit={units.pressureUnit} value={typed} onChange={setTyped} />
      <Button
        variant="contained"
        disabled={typed === ''}
        onClick={() => onSave(units.pressureToPsi(Number(typed)))}
      >
        {t('air.saveGauge')}
      </Button>
    </Stack>
  );
}
