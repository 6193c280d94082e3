import { existsSync } from 'node:fs';
import { installedMajors } from './cluster-programs.mjs';
import { isInstalled } from './debian-packages.mjs';

/** @typedef {import('./debian-packages.mjs').DebianPackage} DebianPackage */

/** @type {DebianPackage[]} */
export const PACKAGES_TO_RUN = [
  { name: 'postgresql', isThere: () => installedMajors().length > 0, isOptional: false },
];

/** @type {DebianPackage[]} */
export const PACKAGES_TO_TEST = [
  ...PACKAGES_TO_RUN,
  { name: 'chromium', isThere: () => existsSync('/usr/bin/chromium'), isOptional: false },
  { name: 'python3-scipy', isThere: () => isInstalled('python3-scipy'), isOptional: true },
  { name: 'units', isThere: () => isInstalled('units'), isOptional: true },
];
