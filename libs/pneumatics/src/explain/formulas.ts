import type { SourceId } from './sources';

/** A formula behind a figure: how it reads, where it holds, what it rests on. */
export interface Formula {
  expression: string;
  range: string;
  sourceIds: readonly SourceId[];
}

/** Every formula of this library, by its stable id. `docs/physics.md` has a section for each. */
export const formulas = {
  'inside-diameter': {
    expression: 'd = OD - 2 t (nominal: minimum wall; average: wall at mid tolerance)',
    range: 'nominal 1/2 to 4 in',
    sourceIds: ['astm-d1785', 'astm-d2241', 'd2241-average-walls', 'astm-d2239', 'astm-b88', 'asme-b36-10'],
  },
  'water-held': {
    expression: 'V = (pi/4) d^2 L; gal per 100 ft = 4.07999 d^2',
    range: 'full pipe',
    sourceIds: ['bore-contents-table'],
  },
  'pipe-rating': {
    expression:
      'P = 2 S / (SDR - 1), P = 2 S / (SIDR + 1), or the printed table; times temperature factor, times 0.72',
    range: 'PVC to 140 F, polyethylene to 100 F, copper joints to 250 F',
    sourceIds: [
      'iso-161-rating',
      'pvc-schedule-ratings',
      'pe-printed-class',
      'ppi-recommendation-c',
      'awwa-m55',
      'copper-joint-ratings',
      'nrcs-surge',
    ],
  },
  'pressure-ceiling': {
    expression: 'the least of policy by material, derated pipe rating, lowest rated part, company cap',
    range: 'blow-out with open heads',
    sourceIds: ['csu-80-50', 'iowa-state-50', 'greeley-blowout', 'lowest-rated-part'],
  },
  'standard-atmosphere': {
    expression: 'h = r z / (r + z); P = 101325 (1 - 0.0065 h / 288.15)^5.25588',
    range: '-1500 to 15000 ft',
    sourceIds: ['us-standard-atmosphere-1976'],
  },
  displacement: {
    expression: 'rule gpm / 7.5; exact gpm / 7.48052; free air = exact (Pg + Patm) / Patm',
    range: 'equal temperatures',
    sourceIds: ['csu-7-5', 'gas-law-isothermal'],
  },
  'open-heads': {
    expression:
      'Cd A = q / sqrt(2 dp / rho); choked below P2/P1 = 0.5283: m = Cd A P1 sqrt(k / (R T)) (2 / (k+1))^((k+1) / (2 (k-1)))',
    range: 'heads without pressure regulation; k = 1.4',
    sourceIds: ['orifice-equivalent', 'orifice-air-table', 'moss-orifice'],
  },
  'compressor-delivery': {
    expression: 'intake volume constant; mass falls with Patm / 14.696',
    range: '-1500 to 15000 ft',
    sourceIds: ['us-standard-atmosphere-1976', 'engine-altitude'],
  },
  'line-pressure-held': {
    expression: 'pressure at which hose, pipe and open heads pass what the compressor delivers',
    range: 'steady flow, air only; outlet Mach under 0.845 in each run',
    sourceIds: ['orifice-equivalent', 'isothermal-darcy', 'hose-coupling-factor'],
  },
  'water-pushed': {
    expression: 'gpm = gpm0 sqrt((P - 0.433 h) / P0), at most 7.48052 F Patm / (P + Patm)',
    range: 'water in front of the air',
    sourceIds: ['orifice-equivalent', 'gas-law-isothermal', 'water-density'],
  },
  'compressor-fit': {
    expression: 'delivered / needed free air, pressure held at dry heads, lift over the highest head',
    range: 'thresholds stated in the inputs',
    sourceIds: [
      'heads-stay-up',
      'pop-up-pressure',
      'small-shop-compressors',
      'common-80-100-cfm',
      'vinchesi-2012',
    ],
  },
  'hose-loss': {
    expression: 'm^2 = A^2 (P1^2 - P2^2) / (R T (f L/D + 2 ln(P1/P2))), f by Colebrook; couplings times 1.5',
    range: 'outlet Mach under 0.845; warning over 10 % and over 40 % of P1',
    sourceIds: [
      'isothermal-darcy',
      'colebrook-1939',
      'harris-formula',
      'hose-coupling-factor',
      'gauge-closed-end',
    ],
  },
  'discharge-temperature': {
    expression: 'T2 = T1 (P2/P1)^((n-1)/n); two stages halve the exponent',
    range: 'dry compression; absolute units',
    sourceIds: ['polytropic-compression', 'screw-discharge'],
  },
  'hose-cooling': {
    expression: 'T(L) = Ta + (T0 - Ta) exp(-U pi D L / (m cp))',
    range: 'steady; U = 10 W/m2K assumed',
    sourceIds: ['hose-cooling', 'vinchesi-2012'],
  },
  'stored-energy': {
    expression: 'E = 2.5 Pt V (1 - (Pa/Pt)^0.286); TNT = E / 4266920 kg; R = 20 (2 TNT)^(1/3), at least 30 m',
    range: 'a code for pressure tests of metal piping: an upper bound for everything closed by mistake',
    sourceIds: ['asme-pcc-2', 'brode', 'water-bulk-modulus'],
  },
  'noise-dose': {
    expression: 'D = 100 sum(C/T); T = 8 / 2^((L-90)/5); TWA = 16.61 log10(D/100) + 90',
    range: '80 to 130 dBA',
    sourceIds: ['osha-1910-95'],
  },
  'air-cycles': {
    expression: 't = V / gpm pushed, times a stated factor; cycles = max(2, t / cap)',
    range: 'a lower bound and a guess over it',
    sourceIds: ['displacement-time', 'short-cycles'],
  },
  'zone-order': {
    expression: 'score = we elevation + wd distance, each from 0 to 1 over the zones of the system',
    range: 'weights stated in the inputs',
    sourceIds: ['highest-farthest-first'],
  },
} as const satisfies Record<string, Formula>;

/** Stable id of a formula. */
export type FormulaId = keyof typeof formulas;
