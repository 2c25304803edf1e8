import Box from '@mui/material/Box';
import ButtonBase from '@mui/material/ButtonBase';
import Typography from '@mui/material/Typography';
import { useId } from 'react';

interface Option<T extends string> {
  value: T;
  label: string;
  hint?: string;
}

interface Frame<T extends string> {
  label: string;
  options: Option<T>[];
  error?: string | null;
}

interface OneProps<T extends string> extends Frame<T> {
  value: T | null;
  onChange: (value: T) => void;
}

/** One choice of a few, as large tiles, two columns at most. */
export function ChoiceTiles<T extends string>({ value, onChange, ...frame }: OneProps<T>) {
  return <Tiles {...frame} role="radio" isChosen={(one) => one === value} onChoose={onChange} />;
}

interface ManyProps<T extends string> extends Frame<T> {
  value: T[];
  onChange: (value: T[]) => void;
}

/** Any number of choices, as large tiles. */
export function ManyTiles<T extends string>({ value, onChange, ...frame }: ManyProps<T>) {
  const toggle = (one: T) =>
    onChange(value.includes(one) ? value.filter((other) => other !== one) : [...value, one]);
  return <Tiles {...frame} role="checkbox" isChosen={(one) => value.includes(one)} onChoose={toggle} />;
}

interface TilesProps<T extends string> extends Frame<T> {
  role: 'radio' | 'checkbox';
  isChosen: (value: T) => boolean;
  onChoose: (value: T) => void;
}

/** The chosen tile carries a mark and a heavier frame, not only a colour. */
function Tiles<T extends string>({ label, options, error, role, isChosen, onChoose }: TilesProps<T>) {
  const heading = useId();
  return (
    <Box role={role === 'radio' ? 'radiogroup' : 'group'} aria-labelledby={heading}>
      <Typography id={heading} variant="h3" component="h2" sx={{ mb: 1 }}>
        {label}
      </Typography>
      <Box sx={{ display: 'grid', gridTemplateColumns: 'repeat(2, minmax(0, 1fr))', gap: 2 }}>
        {options.map((option) => {
          const chosen = isChosen(option.value);
          return (
            <ButtonBase
              key={option.value}
              role={role}
              aria-checked={chosen}
              onClick={() => onChoose(option.value)}
              sx={{
                minHeight: 120,
                p: 1.5,
                flexDirection: 'column',
                gap: 0.5,
                textAlign: 'center',
                border: chosen ? 5 : 2,
                borderColor: chosen ? 'primary.main' : 'divider',
                bgcolor: 'background.paper',
                borderRadius: 1,
                overflowWrap: 'anywhere',
              }}
            >
              <Typography component="span" sx={{ fontWeight: 600 }}>
                {chosen ? '✓ ' : ''}
                {option.label}
              </Typography>
              {option.hint && (
                <Typography component="span" variant="body2">
                  {option.hint}
                </Typography>
              )}
            </ButtonBase>
          );
        })}
      </Box>
      {error && (
        <Typography role="alert" sx={{ color: 'error.main', fontWeight: 600, mt: 1 }}>
          {error}
        </Typography>
      )}
    </Box>
  );
}
