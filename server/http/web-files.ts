import { createHash } from 'node:crypto';
import { readdirSync, readFileSync } from 'node:fs';
import { extname, join, relative, sep } from 'node:path';

/** One page of the exported web app. */
export interface WebPage {
  /** Relative to the export's folder. */
  file: string;
  /** Matches the whole path of an address, without a slash at the end. */
  pattern: RegExp;
  /** Addresses with fewer of these are tried first, so that /leads/new would win over /leads/[id]. */
  dynamicSegments: number;
  inlineStyleHashes: string[];
}

export interface WebFiles {
  pages: WebPage[];
  notFound: WebPage;
  /** Every file that may be served as it is, by its path with a leading slash. */
  assets: Set<string>;
  /** Which compressed forms stand beside a file, by the same path; pages too. */
  encodings: Map<string, ('br' | 'gzip')[]>;
  inlineScriptHashes: string[];
}

const suffixes = { br: '.br', gzip: '.gz' } as const;

/**
 * Reads what an export holds, once, at start. Files and folders whose name begins with a dot are left out.
 * @throws when the folder holds no export
 */
export function readWebFiles(distDir: string): WebFiles {
  const files = listFiles(distDir);
  const names = new Set(files);
  const htmlFiles = files.filter((file) => extname(file) === '.html');
  const notFoundFile = htmlFiles.find((file) => file === '+not-found.html');
  if (notFoundFile === undefined || !names.has('index.html')) {
    throw new Error(`No exported web app in ${distDir}: run "npm run export" first.`);
  }
  const read = (file: string) => readFileSync(join(distDir, file), 'utf8');
  const toPage = (file: string): WebPage => ({ file, ...addressOf(file), inlineStyleHashes: hashInline(read(file), 'style') });
  const scripts = new Set(htmlFiles.flatMap((file) => hashInline(read(file), 'script')));
  const encodings: WebFiles['encodings'] = new Map();
  for (const file of files) {
    const found = (['br', 'gzip'] as const).filter((encoding) => names.has(file + suffixes[encoding]));
    if (found.length > 0) encodings.set(`/${file}`, found);
  }
  return {
    pages: htmlFiles.filter((file) => file !== notFoundFile).map(toPage).sort((a, b) => a.dynamicSegments - b.dynamicSegments),
    notFound: toPage(notFoundFile),
    assets: new Set(files.filter((file) => !['.html', '.br', '.gz'].includes(extname(file))).map((file) => `/${file}`)),
    encodings,
    inlineScriptHashes: [...scripts],
  };
}

function listFiles(distDir: string): string[] {
  return readdirSync(distDir, { recursive: true, withFileTypes: true })
    .filter((entry) => entry.isFile())
    .map((entry) => relative(distDir, join(entry.parentPath, entry.name)).split(sep).join('/'))
    .filter((file) => !file.split('/').some((segment) => segment.startsWith('.')));
}

/** `desk/leads/[id].html` -> /^\/desk\/leads\/[^/]+$/; an `index.html` stands for its folder. */
function addressOf(file: string): Pick<WebPage, 'pattern' | 'dynamicSegments'> {
  const segments = file.replace(/\.html$/, '').split('/').filter((segment) => segment !== 'index');
  const parts = segments.map((segment) => {
    if (/^\[\.\.\..+\]$/.test(segment)) return '.+';
    if (/^\[.+\]$/.test(segment)) return '[^/]+';
    return segment.replace(/[.*+?^${}()|[\]\\]/g, '\\$&');
  });
  const dynamicSegments = segments.filter((segment) => segment.startsWith('[')).length;
  return { pattern: new RegExp(`^/${parts.join('/')}$`), dynamicSegments };
}

/** The CSP hashes of a page's inline elements of one kind. */
function hashInline(html: string, tag: 'script' | 'style'): string[] {
  const elements = html.matchAll(new RegExp(`<${tag}([^>]*)>([\\s\\S]*?)</${tag}>`, 'g'));
  const hashes = new Set<string>();
  for (const [, attributes = '', text = ''] of elements) {
    if (/\ssrc=/.test(attributes) || text === '') continue;
    hashes.add(`sha256-${createHash('sha256').update(text, 'utf8').digest('base64')}`);
  }
  return [...hashes];
}
