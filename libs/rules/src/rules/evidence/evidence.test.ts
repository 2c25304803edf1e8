import { photo, testId } from '@rimeward/field-log/testing';
import { line, type Line } from '@rimeward/field-log/testing/clean-visit';
import { testParts } from '@rimeward/field-log/testing/systems';
import { before, changed, clean, judge, without } from '../../testing/judge';
import { checkRule } from '../../testing/check-rule';

const bare = (type: Line['type']) => clean.map((one) => (one.type === type ? { ...one, photos: [] } : one));
const taken = (change: object) =>
  before('left', [line('photographs-added', { subject: null }, { photos: [{ ...photo(50), ...change }] })]);
const { sha256 } = photo(50);
const site = { latitude: 40.5853, longitude: -105.0844 };
const context = { site };
/** A hundredth of a degree of latitude is 1,112 m on the sphere used here. */
const away = { latitude: 40.5953, longitude: -105.0844 };

checkRule('part-without-photo', {
  finds: { 'taken out unseen': () => judge(bare('part-protected')) },
  leaves: {
    'photographed afterwards': () => {
      const added = line('photographs-added', { subject: testParts.sensor }, { photos: [photo(60)] });
      return judge(before('left', [added], bare('part-protected')));
    },
    'left in place': () => judge(changed('part-protected', { how: 'left' }, bare('part-protected'))),
  },
  params: { part: 'flow-sensor' },
});

checkRule('backflow-without-photo', {
  finds: { 'no picture of any valve': () => judge(bare('valve-set')) },
  leaves: {
    'one picture of the whole assembly': () => {
      const picture = { ...photo(61), role: 'backflow-valve' as const };
      return judge(
        before(
          'left',
          [line('photographs-added', { subject: null }, { photos: [picture] })],
          bare('valve-set'),
        ),
      );
    },
    'still at work': () => judge(bare('valve-set').slice(0, -1)),
  },
  params: {},
});

const damage = (photos: Line['photos']) => [
  line('damage-seen', { where: 'gate', what: 'cracked' }, { photos }),
];
checkRule('damage-without-photo', {
  finds: { 'only told': () => judge(before('water-off', damage([]))) },
  leaves: { shown: () => judge(before('water-off', damage([photo(62)]))) },
  params: { where: 'gate' },
});

const defect = (photos: Line['photos']) => [
  line('defect-found', { zoneId: testId(11), where: 'bed', what: 'split' }, { photos }),
];
checkRule('defect-without-photo', {
  finds: { 'only told': () => judge(before('left', defect([]))) },
  leaves: { shown: () => judge(before('left', defect([photo(63)]))) },
  params: { where: 'bed' },
});

checkRule('photo-used-twice', {
  finds: {
    'on another visit': () => judge(taken({}), { context: { photosElsewhere: { [sha256]: [testId(501)] } } }),
  },
  leaves: {
    'nowhere else': () => judge(taken({}), { context: { photosElsewhere: { [sha256]: [] } } }),
    'not known': () => judge(taken({})),
  },
  params: { sha256, visits: 1 },
});

checkRule('photo-far-from-site', {
  finds: { 'a kilometre away': () => judge(taken({ takenAt: { ...away, accuracyM: 20 } }), { context }) },
  leaves: {
    'a kilometre away, and a position as vague as that': () =>
      judge(taken({ takenAt: { ...away, accuracyM: 1_000 } }), { context }),
    'on the site': () => judge(taken({ takenAt: { ...site, accuracyM: 20 } }), { context }),
    'position refused': () => judge(taken({ takenAt: null }), { context }),
    'site not known': () =>
      judge(taken({ takenAt: { ...away, accuracyM: 20 } }), { context: { site: null } }),
  },
  params: { sha256, distanceM: 1112 },
});

const firstMoment = Date.UTC(2026, 9, 20, 14, 0);
const dated = (hours: number) => ({
  context: { photoTakenMs: { [sha256]: firstMoment - hours * 3_600_000 } },
});
checkRule('photo-taken-earlier', {
  finds: { 'a day before': () => judge(taken({}), dated(24)) },
  leaves: {
    'an hour before': () => judge(taken({}), dated(1)),
    'no date in the file': () => judge(taken({})),
  },
  params: { sha256, hours: 25 },
});

checkRule('photo-from-gallery', {
  finds: { 'one from the gallery': () => judge(taken({ source: 'gallery' })) },
  leaves: { 'from the camera': () => judge(taken({})) },
  params: { photos: 1 },
});

checkRule('part-kept-nowhere', {
  finds: {
    'kept nowhere': () => judge(changed('part-protected', { keptWhere: 'nowhere' })),
    'no word of it': () => judge(changed('part-protected', { keptWhere: null })),
  },
  leaves: {
    'in the truck': () => judge(clean),
    'bypassed, so nothing to keep': () =>
      judge(changed('part-protected', { how: 'bypassed', keptWhere: null })),
  },
  params: { part: 'flow-sensor' },
});

const correct = (body: Record<string, unknown> | null) =>
  judge([...clean, line('corrected', { of: testId(10_001 + waterOffAt), reason: 'slip', body })]);
const waterOffAt = clean.findIndex((one) => one.type === 'water-off');
checkRule('correction-ignored', {
  finds: { 'a body that does not fit': () => correct({ kind: 'sideways' }) },
  leaves: { 'a body that fits': () => correct({ kind: 'was-closed' }), withdrawn: () => correct(null) },
  params: {},
});

checkRule('part-without-photo', {
  finds: {
    'a part found on site': () =>
      judge(
        before('left', [
          line('part-protected', { partId: testId(78), kind: 'filter', how: 'bypassed', keptWhere: null }),
        ]),
      ),
  },
  leaves: { 'nothing taken out': () => judge(without({ type: 'part-protected' })) },
  params: { part: 'filter' },
});
