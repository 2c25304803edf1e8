import type { Source } from '../source';

/** Where ceilings, cautions, heat, energy, noise, cycles and order come from. */
export const safetySources = {
  'csu-80-50': {
    title: 'At most 80 psi in rigid PVC, 50 psi in polyethylene',
    author: 'Colorado State University Extension (M. Higgins)',
    year: null,
    place: 'quoted at gardenguides.com/100407; the fact sheet itself not seen',
    status: 'second-hand',
  },
  'iowa-state-50': {
    title: 'Irrigation winterization: 50 psi is enough for most systems',
    author: 'Iowa State University Extension, turfgrass',
    year: '2009',
    place: 'extension.iastate.edu/turfgrass',
    status: 'published',
  },
  'lowest-rated-part': {
    title: 'The lowest rated part on the path of the air sets the limit',
    author: 'worked out here',
    year: null,
    place: 'docs/physics.md',
    status: 'derived',
  },
  'polytropic-compression': {
    title: 'T2 = T1 (P2/P1)^((n-1)/n); two equal stages with perfect intercooling halve the exponent',
    author: 'textbooks of thermodynamics',
    year: null,
    place: 'published calculators: 70 F, 100 psig gives 493 F',
    status: 'published',
  },
  'screw-discharge': {
    title:
      'Oil-flooded screw machines leave at about 180 to 220 F; an aftercooler brings air to 10 to 20 F over ambient',
    author: 'from memory',
    year: null,
    place: 'no publication found',
    status: 'memory',
  },
  'hose-cooling': {
    title: 'Cooling along a hose: T = Ta + (T0 - Ta) exp(-U pi D L / (m cp)), U = 10 W/m2K assumed',
    author: 'worked out here; an estimate only',
    year: null,
    place: 'docs/physics.md',
    status: 'derived',
  },
  'asme-pcc-2': {
    title:
      'ASME PCC-2, pneumatic pressure tests: equations II-2, II-3 and III-1 (stored energy, TNT, distance)',
    author: 'American Society of Mechanical Engineers',
    year: '2008',
    place: 'studylib.net/doc/27266253; piping-world.com',
    status: 'published',
  },
  brode: {
    title: 'Brode: E = (P - Pa) V / (k - 1)',
    author: 'H. L. Brode',
    year: '1959',
    place: 'figures of tables/stored_energy.csv; the paper not seen',
    status: 'second-hand',
  },
  'water-bulk-modulus': {
    title: 'Bulk modulus of water 2.2 GPa: energy of compressed water P^2 V / (2 K)',
    author: 'reference.com, bulk modulus of water; formula worked out here',
    year: null,
    place: 'reference.com/science',
    status: 'second-hand',
  },
  'osha-1910-95': {
    title: '29 CFR 1910.95 Appendix A, noise dose',
    author: 'Occupational Safety and Health Administration',
    year: null,
    place: 'osha.gov',
    status: 'published',
  },
  'displacement-time': {
    title:
      'Time to first mist is at least water held / water flow; slip and low spots make it 1.5 to 2 times that',
    author: 'worked out here; the factor is common practice and is learned from past visits',
    year: null,
    place: 'docs/physics.md',
    status: 'common-practice',
  },
  'short-cycles': {
    title: 'Two or more short cycles, at most about two minutes each, with a rest; stop at mist',
    author: 'common practice; no extension text with minutes was found',
    year: null,
    place: 'service and municipal pages',
    status: 'common-practice',
  },
  'highest-farthest-first': {
    title: 'Highest and farthest zone first, then back towards the air connection',
    author: 'common practice; no extension text seen',
    year: null,
    place: 'one trade page',
    status: 'common-practice',
  },
  'gauge-closed-end': {
    title: 'A gauge at the compressor shows the pressure of a closed end: no allowance for hose loss',
    author: 'worked out here',
    year: null,
    place: 'docs/physics.md',
    status: 'derived',
  },
} as const satisfies Record<string, Source>;
