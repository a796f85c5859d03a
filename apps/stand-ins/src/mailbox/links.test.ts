import { expect, test } from 'vitest';
import { linksIn, splitAtLinks } from './links.ts';

test('an address ends before the punctuation of its sentence', () => {
  const text = 'Read it at http://127.0.0.1:4370/link/aB-3_x. (Or https://example.com/a?b=1&c=2)';
  expect(linksIn(text)).toEqual([
    'http://127.0.0.1:4370/link/aB-3_x',
    'https://example.com/a?b=1&c=2',
  ]);
});

test('splitting loses nothing', () => {
  const text = 'one http://example.com/1, two\nhttp://example.com/2';
  expect(
    splitAtLinks(text)
      .map((part) => part.text)
      .join(''),
  ).toBe(text);
});

test('addresses of the HTML part are read as the browser would', () => {
  const html = '<a href="http://example.com/?a=1&amp;b=2">x</a><a href="javascript:alert(1)">y</a>';
  expect(linksIn('', html)).toEqual(['http://example.com/?a=1&b=2']);
});
