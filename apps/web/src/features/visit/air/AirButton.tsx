import ButtonBase from '@mui/material/ButtonBase';
import { useTranslation } from 'react-i18next';

interface Props {
  running: boolean;
  disabled: boolean;
  done: boolean;
  nextLabel: string;
  onStart: () => void;
  onStop: () => void;
  onNext: () => void;
}

/** The one control of the air screen: a third of the display, always at the bottom. Square to stop, triangle to start. */
export function AirButton({ running, disabled, done, nextLabel, onStart, onStop, onNext }: Props) {
  const { t } = useTranslation('visit');
  const label = running ? t('air.stop') : done ? nextLabel : t('air.start');
  const act = running ? onStop : done ? onNext : onStart;
  return (
    <ButtonBase
      onClick={act}
      disabled={disabled && !done}
      data-testid={running ? 'stop-air' : 'start-air'}
      sx={{
        width: '100%',
        minHeight: '34dvh',
        fontFamily: 'inherit',
        fontSize: 32,
        fontWeight: 700,
        gap: 2,
        bgcolor: running ? 'error.main' : 'primary.main',
        color: running ? 'error.contrastText' : 'primary.contrastText',
        '&.Mui-disabled': {
          bgcolor: 'background.paper',
          color: 'text.primary',
          border: 3,
          borderColor: 'text.primary',
        },
      }}
    >
      <svg width="48" height="48" viewBox="0 0 48 48" aria-hidden="true">
        {running ? (
          <path d="M8 8h32v32H8z" fill="currentColor" />
        ) : (
          <path d="M12 6l30 18-30 18z" fill="currentColor" />
        )}
      </svg>
      {label}
    </ButtonBase>
  );
}
