import { expect, it } from 'vitest';
import { csvText } from './csv-text';

it('quotes as RFC 4180 (published) says', () => {
  expect(csvText([['a', 'b,c', 'say "hi"', 'two\nlines', 3]])).toBe(
    '\uFEFFa,"b,c","say ""hi""","two\nlines",3\r\n',
  );
});

it('keeps spreadsheets from running a text as a formula', () => {
  expect(csvText([['=1+1', '@cmd', '-2', '+3', 'plain']])).toBe("\uFEFF'=1+1,'@cmd,'-2,'+3,plain\r\n");
});
