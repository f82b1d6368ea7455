import { Clock } from '../src/common/clock';
import { readEnvironment } from '../src/config/environment';
import { Readers } from '../src/database/readers';
import { SizeRatingsReader } from '../src/parts/ratings/size-ratings-reader';
import { buildIndex } from '../src/search/index/build-index';
import type { CatalogueIndex } from '../src/search/index/catalogue-index';

/** The search index of a data directory, read in this process and not in a server. */
export async function openIndex(
  dataDirectory: string,
): Promise<{ index: CatalogueIndex; close: () => Promise<void> }> {
  const environment = readEnvironment({ ...process.env, DATA_DIR: dataDirectory }, process.cwd());
  const readers = new Readers(environment);
  const index = await buildIndex(readers, await new SizeRatingsReader(readers, new Clock()).all());
  return { index, close: () => readers.close() };
}
