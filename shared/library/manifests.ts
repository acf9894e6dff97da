import { type ManifestEntry, manifest } from '../standards/aisc360-22/manifest.ts';

/** What books make of every clause of their standard; theory and properties have no such list. */
const MANIFESTS: Readonly<Record<string, readonly ManifestEntry[]>> = { 'aisc360-22': manifest };

export const manifestOf = (book: string): readonly ManifestEntry[] => MANIFESTS[book] ?? [];
