import { lstatSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { cloneFolder } from './clone.mjs';
import { mustRun, say } from './run.mjs';

const packagesOf = (file) => JSON.parse(readFileSync(join(cloneFolder, file), 'utf8')).packages;

/** Whether node_modules holds the locked packages, by the list that npm leaves when it is done. */
function isInstalled() {
  const locked = packagesOf('package-lock.json');
  let present;
  try {
    present = packagesOf('node_modules/.package-lock.json');
  } catch {
    return false;
  }
  const paths = Object.keys(locked).filter((path) => path !== '');
  return (
    Object.keys(present).every((path) => locked[path]) &&
    paths.every((path) =>
      present[path]
        ? present[path].integrity === locked[path].integrity
        : locked[path].optional === true,
    )
  );
}

/** Installs the locked npm packages when node_modules is missing or the lock file has changed. */
export async function ensurePackages() {
  if (isInstalled()) return;
  const folder = join(cloneFolder, 'node_modules');
  if (lstatSync(folder, { throwIfNoEntry: false })?.isSymbolicLink())
    throw new Error(
      `${folder} is a link to packages that are not the locked ones. Remove the link, so that npm installs here and not where it leads.`,
    );
  say('Installing the npm packages …');
  await mustRun('npm', ['ci', '--ignore-scripts', '--include=dev', '--no-audit', '--no-fund']);
}
