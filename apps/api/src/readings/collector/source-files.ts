import { readdir, realpath, stat } from 'node:fs/promises';
import path from 'node:path';
import { SourceFault } from './source-fault';

const TABLES = /\.(csv|txt|dat|tsv)$/i;

/**
 * The files of a folder source, by name: the file itself, or the tables (.csv, .tsv, .txt, .dat) of its folder. Only
 * what truly lies beneath the loggers' folder is read, links followed.
 */
export async function sourceFiles(loggerDir: string, declared: string): Promise<string[]> {
  const root = await realpath(loggerDir).catch(() => loggerDir);
  const wanted = path.resolve(root, declared);
  let real: string;
  try {
    real = await realpath(wanted);
  } catch (error) {
    const { code } = error as NodeJS.ErrnoException;
    if (code !== 'ENOENT') throw error;
    throw new SourceFault(
      `"${declared}" is not there. Look whether the logger's folder is connected and its name right.`,
      { notThereYet: true },
    );
  }
  if (real !== root && !real.startsWith(root + path.sep)) {
    throw new SourceFault(`"${declared}" leads out of the loggers' folder. Move the files beneath it.`);
  }
  if ((await stat(real)).isFile()) return [real];
  const names = (await readdir(real)).filter((name) => TABLES.test(name)).sort();
  return names.map((name) => path.join(real, name));
}
