import { expect, it } from 'vitest';
import { pathFromStrokes } from './signature-path';

it('scales strokes into the 300 x 100 box and leaves empty ones out', () => {
  const strokes = [
    {
      points: [
        { x: 0, y: 0 },
        { x: 150, y: 50 },
      ],
    },
    { points: [] },
    { points: [{ x: 75, y: 12.5 }] },
  ];
  expect(pathFromStrokes(strokes, 150, 50)).toBe('M0 0L300 100M150 25');
});

it('gives nothing for a canvas without size', () => {
  expect(pathFromStrokes([{ points: [{ x: 1, y: 1 }] }], 0, 50)).toBe('');
});
