import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import Typography from '@mui/material/Typography';
import { useTranslation } from 'react-i18next';

interface Props {
  label: string;
  unit: string;
  /** Digits as typed, "" when nothing is. */
  value: string;
  onChange: (value: string) => void;
  decimals?: boolean;
}

const longest = 5;

/** Our own number pad: 88 px keys, no keyboard that covers half the screen. */
export function NumberPad({ label, unit, value, onChange, decimals = false }: Props) {
  const { t } = useTranslation();
  const keys = ['1', '2', '3', '4', '5', '6', '7', '8', '9', decimals ? '.' : '00', '0', '⌫'];

  function press(key: string): void {
    if (key === '⌫') return onChange(value.slice(0, -1));
    if (key === '.' && (value === '' || value.includes('.'))) return;
    const next = (value + key).replace(/^0+(?=\d)/, '');
    if (next.length <= longest) onChange(next);
  }

  return (
    <Box role="group" aria-label={label}>
      <Typography>{label}</Typography>
      <Typography variant="reading" component="output" sx={{ fontSize: 48, display: 'block' }}>
        {`${value === '' ? '–' : value} ${unit}`}
      </Typography>
      <Box sx={{ display: 'grid', gridTemplateColumns: 'repeat(3, 1fr)', gap: 2, mt: 1 }}>
        {keys.map((key) => (
          <Button
            key={key}
            variant="outlined"
            aria-label={key === '⌫' ? t('deleteDigit') : key}
            onClick={() => press(key)}
            sx={{ minHeight: 88, fontSize: 30 }}
          >
            {key}
          </Button>
        ))}
      </Box>
    </Box>
  );
}
