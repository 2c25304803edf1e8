import { expect, it } from 'vitest';
import { sizeText } from './size-text';

it('writes small sizes in KB and large ones in MB', () => {
  expect(sizeText(450, 'en')).toBe('0 KB');
  expect(sizeText(12_400, 'en')).toBe('12 KB');
  expect(sizeText(3_449_000, 'en')).toBe('3.4 MB');
});
