interface Stroke {
  points: { x: number; y: number }[];
}

/** Strokes of a canvas of the given size as one SVG path in a 300 x 100 box, a tenth of a unit fine. */
export function pathFromStrokes(strokes: Stroke[], width: number, height: number): string {
  if (width <= 0 || height <= 0) return '';
  const at = (point: { x: number; y: number }) =>
    `${round((point.x / width) * 300)} ${round((point.y / height) * 100)}`;
  return strokes
    .filter((stroke) => stroke.points.length > 0)
    .map((stroke) => `M${stroke.points.map(at).join('L')}`)
    .join('');
}

function round(value: number): number {
  return Math.round(value * 10) / 10;
}
