/** Version of what a run computes; it moves with every change of a published or golden result. */
export const ENGINE_VERSION = '0.1.0';

/** What changed in results, newest first. */
export const RESULT_CHANGES: readonly { readonly version: string; readonly change: string }[] = [
  {
    version: '0.1.0',
    change: 'First results: ANSI/AISC 360-22 for rolled W shapes, elastic theory.',
  },
];
