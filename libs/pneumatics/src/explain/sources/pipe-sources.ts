import type { Source } from '../source';

/** Where pipe dimensions, ratings and their derating come from. */
export const pipeSources = {
  'astm-d1785': {
    title: 'ASTM D1785, PVC plastic pipe, Schedules 40 and 80: outside diameters and minimum walls',
    author: 'ASTM, as carried by python3-fluids 1.0.22 (40D1785, 80D1785)',
    year: null,
    place: 'Debian package python3-fluids',
    status: 'published',
  },
  'astm-d2241': {
    title: 'ASTM D2241, PVC pressure-rated pipe (SDR series): outside diameters and minimum walls',
    author: 'ASTM, as carried by python3-fluids 1.0.22 (DR135, DR21, DR26, DR325 D2241)',
    year: null,
    place: 'Debian package python3-fluids',
    status: 'published',
  },
  'pvc-average-diameters': {
    title: 'PVC pipe data: average inside diameters of Schedule 40 and 80',
    author: 'sd-w.com, channel flow, pipe data; sizes.com, materials, pipe PVC',
    year: null,
    place: 'sd-w.com/channel_flow/pipe_data; sizes.com/materials/pipe_PVC.htm',
    status: 'published',
  },
  'd2241-average-walls': {
    title: 'Average inside diameter of SDR pipe from minimum wall and half the tolerance max(0.020 in, 12 %)',
    author: 'worked out here; meets the published Schedule 40 averages within 0.006 in',
    year: null,
    place: 'docs/physics.md',
    status: 'derived',
  },
  'astm-d2239': {
    title: 'ASTM D2239, polyethylene pipe controlled by inside diameter: one inside diameter for every SIDR',
    author:
      'ASTM; that the diameter does not change is published, the figures are from memory (those of Schedule 40)',
    year: null,
    place: 'qualpol.com; engineerfix.com (constancy only)',
    status: 'memory',
  },
  'astm-b88': {
    title: 'ASTM B88 copper water tube: outside diameter is the nominal size plus 1/8 in; walls K, L, M',
    author: 'The Engineering ToolBox, d_779; piping-designer.com, pipe CU ASTM type L',
    year: null,
    place: 'engineeringtoolbox.com; piping-designer.com',
    status: 'published',
  },
  'asme-b36-10': {
    title: 'ASME B36.10 steel pipe, Schedule 40: outside diameters and walls',
    author: 'ASME, as carried by python3-fluids 1.0.22 (schedule 40)',
    year: null,
    place: 'Debian package python3-fluids',
    status: 'published',
  },
  'bore-contents-table': {
    title: 'Contents of 100 ft of pipe by its true bore',
    author: 'The Farm and Garden Rule Book',
    year: null,
    place: 'chestofbooks.com',
    status: 'published',
  },
  'iso-161-rating': {
    title: 'Pressure rating of plastic pipe: P = 2 S / (SDR - 1), P = 2 S / (SIDR + 1)',
    author:
      'USDA NRCS National Engineering Handbook, as cited by ajdesigner.com; A. Moser, Buried Pipe Design, p. 206',
    year: null,
    place: 'ajdesigner.com, plastic pipe',
    status: 'published',
  },
  'pvc-schedule-ratings': {
    title: 'Water pressure ratings at 73 F of Schedule 40 and 80 PVC pipe, 1/2 to 4 in',
    author: 'sd-w.com, PVC pipe data',
    year: null,
    place: 'sd-w.com/channel_flow/pipe_data',
    status: 'published',
  },
  'pe-printed-class': {
    title: 'Polyethylene pipe classes 80, 100, 125, 160, 200 psi for SIDR 19, 15, 11.5, 9, 7 at S = 800 psi',
    author:
      'worked out here; one printed table (qualpol.com) mixes two stresses: the class printed on the pipe is the truth',
    year: null,
    place: 'docs/physics.md',
    status: 'derived',
  },
  'ppi-recommendation-c': {
    title: 'PPI Recommendation C (PPFA User Bulletin 3-96): rating factors of PVC pipe above 73 F',
    author: 'Plastics Pipe Institute; Plastic Pipe and Fittings Association',
    year: '1996',
    place: 'ppfahome.org/ub3.aspx (rows 73 to 90 visible); whole set on two pipe data pages',
    status: 'second-hand',
  },
  'awwa-m55': {
    title: 'AWWA Manual M55, table 4-6: pressure multiplier of polyethylene pipe to 100 F',
    author: 'American Water Works Association',
    year: '2006',
    place: 'scribd.com document 537088330',
    status: 'published',
  },
  'copper-joint-ratings': {
    title:
      'Copper Tube Handbook, table 14.4a: pressure ratings of soldered joints (50-50 tin-lead, the weakest)',
    author: 'Copper Development Association',
    year: null,
    place: 'copper.org/applications/plumbing/cth/technical-data/tables/cth_table4.html',
    status: 'published',
  },
  'nrcs-surge': {
    title:
      'Livestock Watering Systems Handbook, ch. 5: 72 % of the rating where surge is not computed (ASAE S376.1)',
    author: 'USDA NRCS Missouri',
    year: '1997',
    place: 'nrcs.usda.gov',
    status: 'published',
  },
} as const satisfies Record<string, Source>;
