import { spawn, type ChildProcess } from 'node:child_process';
import { join } from 'node:path';

const root = join(__dirname, '..', '..');

export interface ServerProcess {
  readonly url: string;
  readonly output: () => string;
  /** Sends a signal and waits for the end. @returns the exit code, or the signal that ended it */
  readonly end: (signal?: 'SIGTERM' | 'SIGKILL') => Promise<number | string | null>;
}

const running = new Set<ChildProcess>();

/** Ends what a test that failed has left behind. */
export function endLeftServers(): void {
  for (const child of running) child.kill('SIGKILL');
}

const ended = (child: ChildProcess) => new Promise<number | string | null>((resolve) => { child.once('exit', (code, signal) => resolve(code ?? signal)); });

function spawnServer(env: Readonly<Record<string, string>>): { child: ChildProcess; output: () => string } {
  const { PATH, HOME } = process.env;
  const child = spawn(process.execPath, ['--import', 'tsx', 'server/main.ts'], { cwd: root, env: { PATH, HOME, NODE_ENV: 'production', ...env }, stdio: ['ignore', 'pipe', 'pipe'] });
  running.add(child);
  child.once('exit', () => running.delete(child));
  let output = '';
  for (const stream of [child.stdout, child.stderr]) stream?.on('data', (chunk: Buffer) => { output += chunk.toString(); });
  return { child, output: () => output };
}

/** Runs server/main.ts until it ends by itself. */
export async function runServer(env: Readonly<Record<string, string>>): Promise<{ code: number | string | null; output: string }> {
  const { child, output } = spawnServer(env);
  return { code: await ended(child), output: output() };
}

/** Starts server/main.ts as its own process on a free port of this machine. */
export async function startServer(env: Readonly<Record<string, string>>): Promise<ServerProcess> {
  const { child, output } = spawnServer({ PORT: '0', ...env });
  const end = ended(child);
  const port = await new Promise<string>((resolve, reject) => {
    const look = setInterval(() => {
      const found = /"port":(\d+)/.exec(output())?.[1];
      if (found !== undefined) { clearInterval(look); resolve(found); }
    }, 50);
    void end.then((code) => { clearInterval(look); reject(new Error(`The server ended with ${code}:\n${output()}`)); });
  });
  return { url: `http://127.0.0.1:${port}`, output, end: (signal = 'SIGTERM') => { child.kill(signal); return end; } };
}
