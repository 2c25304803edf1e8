import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import Typography from '@mui/material/Typography';
import { useEffect, useRef } from 'react';
import SignaturePad from 'signature_pad';
import { pathFromStrokes } from './signature-path';

interface Props {
  label: string;
  clearLabel: string;
  /** SVG path in a 300 x 100 box; empty when nothing is signed. */
  value: string;
  onChange: (path: string) => void;
}

/** A signature drawn with the finger, kept as a path: small, legible in print, no picture file. */
export function SignaturePadField({ label, clearLabel, value, onChange }: Props) {
  const canvas = useRef<HTMLCanvasElement>(null);
  const pad = useRef<SignaturePad | null>(null);
  const change = useRef(onChange);
  useEffect(() => {
    change.current = onChange;
  }, [onChange]);

  useEffect(() => {
    const element = canvas.current;
    if (!element) return;
    element.width = element.clientWidth;
    element.height = element.clientHeight;
    const drawing = new SignaturePad(element, { minWidth: 1.5, maxWidth: 3 });
    const told = () => change.current(pathFromStrokes(drawing.toData(), element.width, element.height));
    drawing.addEventListener('endStroke', told);
    pad.current = drawing;
    return () => {
      drawing.removeEventListener('endStroke', told);
      drawing.off();
    };
  }, []);

  return (
    <Box>
      <Typography>{label}</Typography>
      <Box
        sx={{
          position: 'relative',
          border: 2,
          borderColor: 'text.primary',
          aspectRatio: '3 / 1',
          bgcolor: '#fff',
        }}
      >
        <canvas
          ref={canvas}
          aria-label={label}
          style={{ width: '100%', height: '100%', touchAction: 'none' }}
        />
        {value && !pad.current?.toData().length && (
          <svg
            viewBox="0 0 300 100"
            style={{ position: 'absolute', inset: 0, pointerEvents: 'none' }}
            aria-hidden="true"
          >
            <path d={value} fill="none" stroke="#14211C" strokeWidth="2" />
          </svg>
        )}
      </Box>
      <Button
        onClick={() => {
          pad.current?.clear();
          onChange('');
        }}
      >
        {clearLabel}
      </Button>
    </Box>
  );
}
