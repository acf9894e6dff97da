import { createHash } from 'node:crypto';
import { readdirSync, readFileSync, statSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { cloneFolder } from './clone.mjs';

function addTo(hash, path) {
  const file = join(cloneFolder, path);
  const status = statSync(file, { throwIfNoEntry: false });
  if (status?.isDirectory()) {
    for (const name of readdirSync(file).sort()) addTo(hash, join(path, name));
  } else if (status?.isFile()) {
    hash.update(`${path}\0${status.size}\0`).update(readFileSync(file));
  }
}

/** SHA-256 over names and contents of files and folders of the clone; a missing one adds nothing. */
export function fingerprint(paths) {
  const hash = createHash('sha256').update(`${process.platform} ${process.arch}\0`);
  for (const path of paths) addTo(hash, path);
  return hash.digest('hex');
}

/** Whether the stamp, a file beside the product that it vouches for, carries this fingerprint. */
export function isStamped(stamp, print) {
  try {
    return readFileSync(join(cloneFolder, stamp), 'utf8') === print;
  } catch {
    return false;
  }
}

export const putStamp = (stamp, print) => writeFileSync(join(cloneFolder, stamp), print);
