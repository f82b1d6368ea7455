import { readFileSync, writeFileSync } from 'node:fs';
import { brotliCompressSync, gzipSync } from 'node:zlib';
import { filesUnder } from './hash-files.mjs';

/** Pictures and fonts are compressed in their own way already. */
const COMPRESSIBLE = /\.(?:css|html|js|svg)$/;

/** Leaves `file.br` and `file.gz` beside each file of the built pages, which the server then sends in its place. */
export function compressPages(directory) {
  for (const file of filesUnder(directory).filter((path) => COMPRESSIBLE.test(path))) {
    const contents = readFileSync(file);
    writeFileSync(`${file}.br`, brotliCompressSync(contents));
    writeFileSync(`${file}.gz`, gzipSync(contents, { level: 9 }));
  }
}
