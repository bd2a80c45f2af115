import { type ChildProcess, spawn } from 'node:child_process';

export interface ServerProcess {
  url: string;
  output: string[];
  process: ChildProcess;
  /** SIGTERM, and the exit code it ended with. */
  stop(): Promise<number | null>;
}

/** Starts a built server on a free port and waits for its one plain line. */
export function startServer(
  entry: 'index' | 'demo',
  environment: Record<string, string>,
): Promise<ServerProcess> {
  const child = spawn(process.execPath, [`dist/server/${entry}.js`], {
    env: { ...process.env, PORT: '0', ...environment },
    stdio: ['ignore', 'pipe', 'pipe'],
  });
  const output: string[] = [];
  const errors: string[] = [];
  const exited = new Promise<number | null>((resolve) => child.once('exit', resolve));
  child.stderr.on('data', (chunk: Buffer) => errors.push(chunk.toString()));
  return new Promise((resolve, reject) => {
    let text = '';
    child.stdout.on('data', (chunk: Buffer) => {
      text += chunk.toString();
      const lines = text.split('\n');
      text = lines.pop() ?? '';
      output.push(...lines);
      const ready = lines
        .map((line) => /^Tallyloft is listening on (http:\/\/\S+)$/.exec(line))
        .find(Boolean);
      const url = ready?.[1];
      if (url === undefined) return;
      const stop = () => {
        child.kill('SIGTERM');
        return exited;
      };
      resolve({ url, output, process: child, stop });
    });
    void exited.then((code) => reject(new Error(`the server ended with ${code}: ${errors.join('').trim()}`)));
  });
}
