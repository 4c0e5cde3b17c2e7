import { existsSync } from 'node:fs';
import { installDebianPackages } from './debian.mjs';

const DEBIAN_CHROMIUM = '/usr/bin/chromium';

/** Debian's Chromium, in which the end-to-end tests run. @param {{ install: boolean, signal?: AbortSignal }} options */
export async function ensureChromium({ install, signal }) {
  const program = process.env.CHROMIUM ?? DEBIAN_CHROMIUM;
  if (existsSync(program)) return program;
  const otherwise = '\nOr set CHROMIUM to the path of one that is installed already.';
  await installDebianPackages('Chromium', ['chromium'], { allowed: install, otherwise, signal });
  return program;
}
