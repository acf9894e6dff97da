import { describe, expect, it } from 'vitest';
import { besidePrinted, differenceText, roundsToPrinted } from './agreement.ts';

describe('a computed value beside a published one', () => {
  it.each([
    [893.2027, '893', true],
    [893.51, '893', false],
    [1127.175, '1130', true],
    [1124.9, '1130', false],
    [10.5, '10', true],
    [0.9293, '0.928', false],
    [0.9285, '0.928', true],
    [57.98, '58.0', true],
    [58.06, '58.0', false],
  ])('%d and %s: agrees %s', (value, printed, agrees) => {
    expect(roundsToPrinted(value, printed)).toBe(agrees);
  });
  it.each([
    [893.20267, '893', '893.20'],
    [0.929301, '0.928', '0.92930'],
    [5050, '5050', '5050.00'],
    [1.0176, '1.02', '1.0176'],
  ])('%d beside %s prints %s', (value, printed, text) => {
    expect(besidePrinted(value, printed)).toBe(text);
  });
  it.each([
    [893.2027, '893', '+0.02 %'],
    [0.98, '1', '−2.00 %'],
    [5050, '5050', '0.00 %'],
    [378.99, '379', '0.00 %'],
  ])('%d against %s: %s', (value, printed, text) => {
    expect(differenceText(value, printed)).toBe(text);
  });
});
