import { published } from '../finding/rule';

/** Published sources that rules stand on; where a text was seen second-hand, the name says so. */
export const greeley = published(
  'City of Greeley, Colorado, water department, guidance on winterizing (air joins downstream of the backflow assembly, never through it; shutoff handles and test cocks at 45 degrees)',
);
export const extensionCeilings = published(
  'Colorado State University Extension as quoted second-hand (80 psi rigid PVC, 50 psi polyethylene); Iowa State University Extension, 12 Nov 2009 (50 psi is enough for most systems)',
);
export const deadEnds = published(
  'B. Vinchesi, Golf Course Industry, November 2012 (air needs open heads: a closed end takes the full pressure)',
);
export const hotParts = published(
  'B. Vinchesi, Golf Course Industry, November 2012 (hot air melts diaphragms and plastic parts)',
);
export const safetyChains = published(
  '30 CFR 77.412(d), safety chains or locks on air hose couplings, a rule for mines taken here as good practice; 29 CFR 1926.302(b), a rule for construction',
);
export const directedAir = published(
  '30 CFR 77.412(c), compressed air is never directed at a person, a rule for mines taken here as good practice; 29 CFR 1910.242(b)',
);
