import Alert from '@mui/material/Alert';
import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import { useEffect, useRef } from 'react';

interface Props {
  message: string;
  tone?: 'saved' | 'fault';
  undoLabel?: string;
  onUndo?: () => void;
  onGone: () => void;
}

/** How long a slip can be taken back with one tap, ms. */
const undoMs = 10_000;

/** Says what has just been saved, and offers to take it back for ten seconds. A fault stays until it is tapped away. */
export function UndoBar({ message, tone = 'saved', undoLabel, onUndo, onGone }: Props) {
  const gone = useRef(onGone);
  useEffect(() => {
    gone.current = onGone;
  }, [onGone]);
  useEffect(() => {
    if (tone === 'fault') return;
    const timer = setTimeout(() => gone.current(), undoMs);
    return () => clearTimeout(timer);
  }, [tone]);
  return (
    <Box sx={{ position: 'fixed', top: 8, left: 8, right: 8, zIndex: 20, maxWidth: 624, mx: 'auto' }}>
      <Alert
        icon={false}
        severity={tone === 'fault' ? 'error' : 'success'}
        role={tone === 'fault' ? 'alert' : 'status'}
        variant="filled"
        sx={{ alignItems: 'center', fontSize: 18, '& .MuiAlert-message': { flexGrow: 1 } }}
        action={
          onUndo ? (
            <Button color="inherit" variant="outlined" onClick={onUndo}>
              {undoLabel}
            </Button>
          ) : (
            <Button color="inherit" onClick={onGone}>
              OK
            </Button>
          )
        }
      >
        {message}
      </Alert>
    </Box>
  );
}
