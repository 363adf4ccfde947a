import { mkdtempSync, rmSync } from 'node:fs';
import os from 'node:os';
import path from 'node:path';
import { onTestFinished } from 'vitest';
import { homeAt } from '@/scripts/house/home.mjs';

export function scratchFolder(): string {
  const folder = mkdtempSync(path.join(os.tmpdir(), 'tamis-house-'));
  onTestFinished(() => rmSync(folder, { recursive: true, force: true }));
  return folder;
}

export const scratchHome = () => homeAt(path.join(scratchFolder(), '.data'));
