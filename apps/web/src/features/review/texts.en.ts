const en = { title: 'Morning review' };
export type ReviewTexts = typeof en;
export default en;
