import { writeFileSync } from 'node:fs';
import { pathToFileURL } from 'node:url';
import type { Figure } from './figure';

/** node --import tsx run-bench.ts <bench> <result>: one bench in one process. */
const [file, result] = process.argv.slice(2);
if (!file || !result) throw new Error('give the bench and the file for its figures');
const { default: bench } = (await import(pathToFileURL(file).href)) as { default: () => Promise<readonly Figure[]> };
writeFileSync(result, JSON.stringify(await bench()));
