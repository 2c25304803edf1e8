import { foldVisit } from '@rimeward/field-log';
import { entry, testId } from '@rimeward/field-log/testing';
import { expect, it } from 'vitest';
import { surelyBefore } from './surely-before';

const note = (device: number, seq: number, minute: number, offsetMs: number | null) => {
  const written = entry('note-written', { text: 'x' }, { device: testId(device), seq, minute });
  const [folded] = foldVisit([{ ...written, time: { ...written.time, offsetMs } }]).entries;
  if (!folded) throw new Error('an entry folds into one');
  return folded;
};

it('goes by the numbers of one phone, whatever its clock says', () => {
  expect(surelyBefore(note(1, 1, 90, null), note(1, 2, 10, null), 3)).toBe(true);
  expect(surelyBefore(note(1, 2, 10, null), note(1, 1, 90, null), 3)).toBe(false);
});

it('believes two measured clocks to a few seconds, and others to a few minutes', () => {
  expect(surelyBefore(note(1, 1, 10, 0), note(2, 1, 11, 0), 3)).toBe(true);
  expect(surelyBefore(note(1, 1, 10, 0), note(2, 1, 10, 4_000), 3)).toBe(false);
  expect(surelyBefore(note(1, 1, 10, 0), note(2, 1, 11, null), 3)).toBe(false);
  expect(surelyBefore(note(1, 1, 10, 0), note(2, 1, 14, null), 3)).toBe(true);
});
