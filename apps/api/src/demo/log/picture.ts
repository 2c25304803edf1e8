import { createHash } from 'node:crypto';
import sharp from 'sharp';
import { Chance } from '../chance';
import type { PictureOf } from './line';

export interface Picture {
  sha256: string;
  bytes: Buffer;
}

/** Draws a photograph's stand-in: what it shows follows from its role, the rest from its name. No two are alike. */
export async function drawPicture(name: string, of: PictureOf, takenAt: Date): Promise<Picture> {
  const chance = new Chance(`picture ${name}`);
  const taken = takenAt.toISOString().slice(0, 19).replaceAll('-', ':').replace('T', ' ');
  const bytes = await sharp(Buffer.from(scene(of, chance)))
    .withExif({ IFD0: { DateTime: taken }, IFD2: { DateTimeOriginal: taken } })
    .jpeg({ quality: 82 })
    .toBuffer();
  return { sha256: createHash('sha256').update(bytes).digest('hex'), bytes };
}

function scene(of: PictureOf, chance: Chance): string {
  const sky = `hsl(${chance.whole(195, 220)} 30% ${chance.whole(62, 80)}%)`;
  const ground = `hsl(${chance.whole(28, 70)} 28% ${chance.whole(28, 42)}%)`;
  const horizon = chance.whole(220, 380);
  return `<svg xmlns="http://www.w3.org/2000/svg" width="960" height="720">
    <rect width="960" height="720" fill="${sky}"/>
    <rect y="${horizon}" width="960" height="${720 - horizon}" fill="${ground}"/>
    ${stones(chance, horizon)}
    <g transform="translate(${chance.whole(380, 560)} ${chance.whole(330, 440)}) rotate(${chance.whole(-6, 6)})">
      ${subjects[of](chance)}
    </g></svg>`;
}

function stones(chance: Chance, horizon: number): string {
  return Array.from({ length: 60 }, () => {
    const radius = chance.whole(2, 12);
    const tone = `hsl(${chance.whole(25, 80)} 20% ${chance.whole(25, 60)}%)`;
    return `<circle cx="${chance.whole(0, 960)}" cy="${chance.whole(horizon, 720)}" r="${radius}" fill="${tone}"/>`;
  }).join('');
}

const pipe =
  '<rect x="-420" y="-28" width="840" height="56" rx="8" fill="#b9bcb4" stroke="#6d6f68" stroke-width="4"/>';
const box =
  '<rect x="-230" y="-170" width="460" height="340" rx="18" fill="#3d4a41" stroke="#222b25" stroke-width="8"/>';

/** A lever on a ball valve: along the pipe is open, across it closed, between the two half open. */
const lever = (degrees: number): string =>
  `<circle r="62" fill="#b08a3c" stroke="#6b5220" stroke-width="6"/>
   <g transform="rotate(${degrees})"><rect x="-18" y="-16" width="190" height="32" rx="12" fill="#c2410c"/></g>`;

const subjects: Record<PictureOf, (chance: Chance) => string> = {
  'sensitive-part': () => `${box}${pipe}<circle r="58" fill="#d9d6cb" stroke="#55584f" stroke-width="8"/>`,
  'backflow-valve': (chance) => `${pipe}${lever(-45 + chance.whole(-4, 4))}`,
  'damage-before-work': () =>
    `${pipe}<path d="M-60 -28 l30 20 l-20 14 l40 22" stroke="#222" stroke-width="8" fill="none"/>`,
  defect: () =>
    `${box}<path d="M-120 40 q60 -160 120 0 t120 0" stroke="#dfe7ea" stroke-width="14" fill="none"/>`,
  'air-connection': () =>
    `${pipe}<rect x="-40" y="-190" width="80" height="170" fill="#b08a3c"/><rect x="-60" y="-220" width="120" height="44" rx="10" fill="#7a1f1f"/>`,
  drain: () =>
    `${pipe}<rect x="-26" y="28" width="52" height="120" fill="#8a8d85"/><path d="M0 150 v90" stroke="#6aa3bd" stroke-width="16"/>`,
  site: (chance) =>
    `<path d="M-260 60 v-160 l190 -110 l190 110 v160 z" fill="hsl(${chance.whole(0, 50)} 24% 60%)" stroke="#333" stroke-width="6"/><rect x="-110" y="-30" width="70" height="90" fill="#4a3a2a"/>`,
};
