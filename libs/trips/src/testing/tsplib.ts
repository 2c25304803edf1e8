import { costMatrix, type CostMatrix } from '../tour/cost-matrix';
import { readCsv } from './fixtures';

interface Node {
  x: number;
  y: number;
}

/** Rounded plane distance of TSPLIB (EUC_2D). */
export const planeDistance = (a: Node, b: Node): number => Math.floor(Math.hypot(a.x - b.x, a.y - b.y) + 0.5);

/** Geographical distance of TSPLIB (GEO): degrees and minutes as DDD.MM, its own pi and radius, rounded up by int(+1). */
export function geoDistance(a: Node, b: Node): number {
  const [latA, lonA, latB, lonB] = [a.x, a.y, b.x, b.y].map(tsplibRadians) as [
    number,
    number,
    number,
    number,
  ];
  const q1 = Math.cos(lonA - lonB);
  const q2 = Math.cos(latA - latB);
  const q3 = Math.cos(latA + latB);
  return Math.floor(6378.388 * Math.acos(0.5 * ((1 + q1) * q2 - (1 - q1) * q3)) + 1);
}

function tsplibRadians(dddMm: number): number {
  const degrees = Math.trunc(dddMm);
  return (3.141592 * (degrees + (5 * (dddMm - degrees)) / 3)) / 180;
}

/** A TSPLIB instance from the fixtures. */
export function tsplibCosts(name: string): CostMatrix {
  const rows = readCsv(`${name}.csv`);
  const geo = rows[0] !== undefined && 'lat_ddd.mm' in rows[0];
  const nodes = rows.map((row) => ({
    x: Number(geo ? row['lat_ddd.mm'] : row['x']),
    y: Number(geo ? row['lon_ddd.mm'] : row['y']),
  }));
  return costMatrix(nodes.length, (a, b) =>
    (geo ? geoDistance : planeDistance)(nodes[a] as Node, nodes[b] as Node),
  );
}
