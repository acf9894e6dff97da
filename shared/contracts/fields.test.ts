import { expect, it } from 'vitest';
import { line, name, text } from './fields.ts';

const takes = (field: ReturnType<typeof text>, value: string) => field.safeParse(value).success;

it.each(['', 'C-07', 'Träger Ø 300', '梁 1', '🏗', '<script>'])('takes "%s" as a line', (value) => {
  expect(takes(line(20), value)).toBe(true);
});

it.each(['a\u0000', 'a\u0007', 'a\u001b[0m', 'a\u0085', '\ud800', 'a\nb', 'a\tb', 'a\rb'])(
  'refuses %j as a line',
  (value) => {
    expect(takes(line(20), value)).toBe(false);
  },
);

it('takes line breaks in a text, up to its length', () => {
  expect(takes(text(5), 'a\nb\tc')).toBe(true);
  expect(takes(text(5), 'a\nb\tcd')).toBe(false);
});

it('wants a name to hold something, and trims it', () => {
  expect(name(5).safeParse('   ').success).toBe(false);
  expect(name(5).parse(' P1 ')).toBe('P1');
});
