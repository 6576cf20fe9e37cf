/** Debian's Chromium, started without a display. */
import { spawnSync } from 'node:child_process';
import { chromium } from 'playwright-core';
import type { Browser } from 'playwright-core';

const FLAGS = [
  '--headless',
  '--no-sandbox',
  '--disable-gpu',
  '--disable-quic',
  '--no-first-run',
  '--disable-background-networking',
  '--disable-component-update',
  '--disable-sync',
];

/** Starts a browser; the caller closes it. Throws when no Chromium is installed. */
export async function launchBrowser(): Promise<Browser> {
  const executablePath = chromiumPath();
  if (!executablePath) throw new Error('No Chromium is installed. Run: apt-get install -y chromium');
  return chromium.launch({ executablePath, args: FLAGS });
}

/** Where Chromium is installed, or undefined. */
export function chromiumPath(): string | undefined {
  for (const name of ['chromium', 'chromium-browser']) {
    const { stdout } = spawnSync('which', [name], { encoding: 'utf8' });
    if (stdout.trim() !== '') return stdout.trim();
  }
  return undefined;
}
