import { readdirSync } from 'node:fs';
import { readFile, writeFile } from 'node:fs/promises';
import { extname, join } from 'node:path';
import { promisify } from 'node:util';
import { brotliCompress, constants, gzip } from 'node:zlib';

const texts = new Set(['.html', '.js', '.css', '.json', '.svg', '.txt', '.ico']);
const tooSmallBytes = 1_000;

/**
 * Puts a brotli and a gzip form beside every text file, as small as they get: it is done once and sent often.
 * @param {string} dir
 */
export async function compressFiles(dir) {
  const files = readdirSync(dir, { recursive: true, withFileTypes: true })
    .filter((entry) => entry.isFile() && texts.has(extname(entry.name)))
    .map((entry) => join(entry.parentPath, entry.name));
  await Promise.all(files.map(compressFile));
}

/** @param {string} file */
async function compressFile(file) {
  const content = await readFile(file);
  if (content.length < tooSmallBytes) return;
  const size = { [constants.BROTLI_PARAM_SIZE_HINT]: content.length, [constants.BROTLI_PARAM_QUALITY]: constants.BROTLI_MAX_QUALITY };
  const [br, gz] = await Promise.all([
    promisify(brotliCompress)(content, { params: size }),
    promisify(gzip)(content, { level: constants.Z_BEST_COMPRESSION }),
  ]);
  if (br.length < content.length) await writeFile(`${file}.br`, br);
  if (gz.length < content.length) await writeFile(`${file}.gz`, gz);
}
