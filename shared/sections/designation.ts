/** A designation as somebody types it, cleaned: `w12×79`, `W 12 X 79` → `W12X79`; `Pipe 8 x-Strong` → `PIPE8XS`. */
export const cleanDesignation = (text: string): string =>
  text
    .toUpperCase()
    .replace(/\s+/g, '')
    .replace(/[×*]/g, 'X')
    .replace(/\.$/, '')
    .replace(/^(PIPE.*?)(X{1,2})-?STRONG$/, '$1$2S');

/** The same section under one key, however its numbers are written: 6.000, 6; 0.375, .375. */
export const designationKey = (text: string): string =>
  cleanDesignation(text).replace(
    /\d*\.\d+/g,
    (number) => number.replace(/^0+/, '').replace(/\.?0+$/, '') || '0',
  );

/** A designation as it is set in print: `W12×79`, `HSS8×6×1/2`, `Pipe 8 XS`. */
export const printedDesignation = (designation: string): string =>
  designation
    .replace(/(?<=[\d.])X(?=[\d.])/g, '×')
    .replace(/^Pipe([\d/-]+)(STD|XS|XXS)$/, 'Pipe $1 $2');
