import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { findCircles, importsOf, root, sourceFiles, type Import } from './support/imports';

// The table "Map of the house" in DEVELOPERS.md, and the browser's: what it must never load.
interface Room {
  /** Files of ours that it may import, by the beginning of their path. */
  ours: readonly string[];
  /** Packages that it may import; undefined: any. */
  packages?: readonly string[];
}

const rooms: Record<string, Room> = {
  app: { ours: ['components/'] },
  components: { ours: ['components/', 'shared/', 'assets/'] },
  server: { ours: ['server/', 'shared/', 'pricing/'] },
  pricing: {
    ours: ['pricing/', 'shared/facts.ts', 'shared/loads.ts', 'shared/quote.ts', 'shared/money.ts', 'shared/units.ts', 'shared/zod.ts'],
    packages: ['zod', 'json-logic-engine'],
  },
  shared: { ours: ['shared/'], packages: ['zod'] },
};

const files = sourceFiles(Object.keys(rooms));
const imports = files.flatMap(importsOf);
const told = ({ from, words }: Import) => `${from} imports ${words}`;
const inRoom = (name: string) => imports.filter(({ from }) => from.startsWith(`${name}/`));
const linesOf = (file: string) => readFileSync(join(root, file), 'utf8').trimEnd().split('\n').length;
const framesRoutes = (file: string) => /(^|\/)(_layout|\+html)\.tsx$/.test(file);

describe('who may import whom', () => {
  it('looks at all of the house', () => {
    for (const name of Object.keys(rooms)) expect(inRoom(name).length).toBeGreaterThan(0);
  });

  it.each(Object.entries(rooms))('%s', (name, { ours, packages }) => {
    const strangers = inRoom(name).filter(({ file, words }) => {
      if (file !== null) return !ours.some((beginning) => file.startsWith(beginning));
      return packages !== undefined && !packages.some((allowed) => words === allowed || words.startsWith(`${allowed}/`));
    });
    expect(strangers.map(told)).toEqual([]);
  });

  it('an address imports nothing but a screen and the router', () => {
    const addresses = inRoom('app').filter(({ from }) => !framesRoutes(from));
    expect(addresses.filter(({ file, words }) => file === null && !/^expo-router(\/|$)/.test(words)).map(told)).toEqual([]);
  });

  it('the stand-ins for payments and mail are programs, imported by nobody', () => {
    const reached = imports.filter(({ from, file }) => file?.startsWith('server/fakes/') && !from.startsWith('server/fakes/'));
    expect(reached.map(told)).toEqual([]);
  });

  it('public screens import nothing of the desk', () => {
    const reached = inRoom('components').filter(({ from, file }) => file?.startsWith('components/desk/') && !from.startsWith('components/desk/'));
    expect(reached.map(told)).toEqual([]);
  });

  it('the desk is one piece that only its own addresses load, and only when they are opened', () => {
    const apart = inRoom('app').filter(({ file }) => file?.startsWith('components/desk/'));
    expect(apart.map(({ file }) => file).filter((file) => !/\/desk-(later|home)\.tsx$/.test(file ?? ''))).toEqual([]);
    const loaded = inRoom('components').filter(({ file }) => file === 'components/desk/desk-pages.ts');
    expect(loaded.map(({ from }) => from)).toEqual(['components/desk/desk-later.tsx']);
  });

  it('a circle is seen when there is one, and types alone make none', () => {
    const edge = (from: string, file: string, typeOnly = false): Import => ({ from, file, words: file, typeOnly });
    expect(findCircles([edge('a', 'b'), edge('b', 'c'), edge('c', 'b')])).toEqual([['b', 'c', 'b']]);
    expect(findCircles([edge('a', 'b'), edge('b', 'a', true)])).toEqual([]);
  });

  it('no files import one another in a circle', () => {
    expect(findCircles(imports)).toEqual([]);
  });
});

describe('who does what', () => {
  it('an address is a line or two that hands on to a screen', () => {
    const addresses = files.filter((file) => file.startsWith('app/') && !framesRoutes(file));
    expect(addresses.filter((file) => linesOf(file) > 5)).toEqual([]);
  });

  it('only server/main.ts starts the server', () => {
    const listens = files.filter((file) => /\.listen\(/.test(readFileSync(join(root, file), 'utf8')));
    const product = listens.filter((file) => !file.startsWith('server/fakes/') && !file.startsWith('server/cli/'));
    expect(product).toEqual(['server/main.ts']);
  });
});
