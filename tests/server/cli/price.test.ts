import { execFile } from 'node:child_process';
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { exampleIntake } from '../../../server/cli/example-intake';
import { parseIntake } from '../../../server/cli/parse-intake';
import { factsSchema } from '../../../shared/facts';
import { factsOf } from '../../../shared/api/intake-input';
import { problemSchema } from '../../../shared/problem';
import { quoteDocumentSchema } from '../../../shared/quote';

const root = join(__dirname, '../../..');
const run = (args: readonly string[], stdin = ''): Promise<{ code: number; stdout: string; stderr: string }> =>
  new Promise((resolve) => {
    const child = execFile(process.execPath, ['--import', 'tsx', 'server/cli/price.ts', ...args], { cwd: root }, (error, stdout, stderr) =>
      resolve({ code: error ? Number(error.code) : 0, stdout, stderr }),
    );
    child.stdin?.end(stdin);
  });

describe('reading an intake', () => {
  it('fills in what is left out as not known', () => {
    const parsed = parseIntake('{"facts":{"zip":"00017","loads":{"range":{"present":true}}}}');
    if (!('input' in parsed)) throw new Error('refused');
    const facts = factsOf(parsed.input);
    expect(factsSchema.parse(facts)).toEqual(facts);
    expect([facts.zip, facts.loads.range, facts.loads.dryer, facts.mainBreakerAmps]).toEqual([
      '00017',
      { present: true, amount: null },
      { present: null, amount: null },
      null,
    ]);
  });

  // Source: RFC 9457 problem documents, RFC 6901 pointers.
  it.each([
    ['{"facts":{"zip":"1"}}', '/facts/zip'],
    ['{"facts":{"colour":"red"}}', '/facts/colour'],
    ['{"facts":{"loads":{"range":{"present":1}}}}', '/facts/loads/range/present'],
    ['{"facts":{"loads":{"sauna":{"present":true}}}}', '/facts/loads/sauna'],
    ['{"facts":{"room":{"widthFt":5,"depthFt":22}}}', '/facts/room/widthFt'],
    ['{"facts":{},"pricedOn":"May 12"}', '/pricedOn'],
    ['{}', '/facts'],
    ['[]', ''],
    ['{"facts":{"a/b~c":1}}', '/facts/a~1b~0c'],
  ])('refuses %s and points at %s', (text, pointer) => {
    const parsed = parseIntake(text);
    if (!('problem' in parsed)) throw new Error('not refused');
    expect(problemSchema.parse(parsed.problem).status).toBe(422);
    expect(parsed.problem.errors?.map((error) => error.pointer)).toContain(pointer);
  });
});

describe('npm run price', () => {
  it('prices its own example from a file and from stdin alike', async () => {
    const example = await run(['--example']);
    expect([example.code, JSON.parse(example.stdout)]).toEqual([0, exampleIntake]);
    const folder = mkdtempSync(join(tmpdir(), 'price-'));
    writeFileSync(join(folder, 'intake.json'), example.stdout);
    const [file, stdin] = await Promise.all([run([join(folder, 'intake.json')]), run([], example.stdout)]);
    rmSync(folder, { recursive: true });
    expect([file.code, stdin.code]).toEqual([0, 0]);
    expect(stdin.stdout).toBe(file.stdout);
    const document = quoteDocumentSchema.parse(JSON.parse(file.stdout));
    expect(document.outcome).toBe('firm');
    expect(document.facts.find((fact) => fact.name === 'zip')?.words).toContain('00017');
  });

  it('ends with 2 and a problem document on stderr for bad input', async () => {
    const results = await Promise.all([run([], 'nonsense'), run(['/no/such/file.json']), run(['--what']), run([], '{"facts":{"zip":7}}')]);
    for (const { code, stdout, stderr } of results) {
      expect([code, stdout]).toEqual([2, '']);
      expect(problemSchema.safeParse(JSON.parse(stderr)).success).toBe(true);
    }
  });
});
