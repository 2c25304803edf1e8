import Button from '@mui/material/Button';
import Stack from '@mui/material/Stack';
import Typography from '@mui/material/Typography';
import { useTranslation } from 'react-i18next';

interface Props {
  label: string;
  value: number;
  /** False while nobody has said a value yet: the proposal shows in brackets. */
  known?: boolean;
  display: string;
  step: number;
  min: number;
  max: number;
  onChange: (value: number) => void;
}

/** Less and more in big steps, for gloves. */
export function Stepper({ label, value, known = true, display, step, min, max, onChange }: Props) {
  const { t } = useTranslation();
  const to = (next: number) => onChange(Math.min(max, Math.max(min, next)));
  return (
    <Stack direction="row" spacing={2} role="group" aria-label={label} sx={{ alignItems: 'center' }}>
      <Button
        variant="outlined"
        aria-label={t('less')}
        onClick={() => to(value - step)}
        sx={{ minWidth: 80, minHeight: 80, fontSize: 36 }}
      >
        −
      </Button>
      <Typography variant="reading" component="output" sx={{ flexGrow: 1, textAlign: 'center' }}>
        {known ? display : `(${display})`}
      </Typography>
      <Button
        variant="outlined"
        aria-label={t('more')}
        onClick={() => to(value + step)}
        sx={{ minWidth: 80, minHeight: 80, fontSize: 36 }}
      >
        +
      </Button>
    </Stack>
  );
}
