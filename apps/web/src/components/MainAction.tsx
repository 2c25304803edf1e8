import Button from '@mui/material/Button';
import type { ReactNode } from 'react';

interface Props {
  children: ReactNode;
  onClick?: () => void;
  disabled?: boolean;
  /** Ember is kept for air and danger. */
  tone?: 'primary' | 'ember';
  type?: 'button' | 'submit';
}

/** The one main action of a phone screen: full width, 96 px high, under the thumb. */
export function MainAction({ children, onClick, disabled, tone = 'primary', type = 'button' }: Props) {
  return (
    <Button
      fullWidth
      type={type}
      variant="contained"
      color={tone === 'ember' ? 'error' : 'primary'}
      disabled={disabled}
      onClick={onClick}
      data-main-action=""
      sx={{
        minHeight: 96,
        fontSize: 22,
        '&.Mui-disabled': { border: 2, borderStyle: 'dashed', bgcolor: 'transparent' },
      }}
    >
      {children}
    </Button>
  );
}
