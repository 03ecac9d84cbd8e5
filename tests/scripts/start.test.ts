import { execFile } from 'node:child_process';
import { copyFile, mkdtemp, rm } from 'node:fs/promises';
import { createServer, type AddressInfo } from 'node:net';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { describe, expect, it } from 'vitest';

interface Ended {
  readonly code: number;
  readonly words: string;
}

function run(command: string, args: string[], env: Record<string, string> = {}): Promise<Ended> {
  return new Promise((resolve) => {
    execFile(command, args, { env: { ...process.env, ...env } }, (error, stdout, stderr) => {
      resolve({ code: typeof error?.code === 'number' ? error.code : 0, words: stdout + stderr });
    });
  });
}

describe('npm start', { timeout: 60_000 }, () => {
  it('says so where the port is taken, and how to choose another', async () => {
    const other = createServer();
    await new Promise<void>((resolve) => other.listen(0, '127.0.0.1', resolve));
    const { port } = other.address() as AddressInfo;
    const { code, words } = await run('bash', ['scripts/start'], { PORT: String(port), HOST: '127.0.0.1' });
    other.close();
    expect(code).toBe(1);
    expect(words).toContain(`PORT ${port} on 127.0.0.1 is taken`);
    expect(words).toMatch(/PORT=\d+ npm start/);
  });

  it.each(['abc', '0', '70000'])('refuses PORT=%s', async (port) => {
    const { code, words } = await run('bash', ['scripts/start'], { PORT: port });
    expect(code).toBe(1);
    expect(words).toContain('Give a number from 1 to 65535');
  });

  it('refuses a HOST that is not of this machine', async () => {
    const { code, words } = await run('bash', ['scripts/start'], { HOST: '192.0.2.1', PORT: '3999' });
    expect(code).toBe(1);
    expect(words).toContain('Cannot listen on HOST 192.0.2.1');
  });
});

describe('a missing package', () => {
  it('makes an ordinary person without sudo read exactly what root must run', async () => {
    const script = [
      'cd scripts/lib; . ./say.sh; . ./packages.sh',
      'id() { echo 1000; }; sudo() { return 1; }; apt-get() { echo touched; }',
      'install_debian_packages PostgreSQL postgresql </dev/null',
    ].join('\n');
    const { code, words } = await run('bash', ['-c', script]);
    expect(code).toBe(1);
    expect(words).toContain('apt-get update && apt-get install -y --no-install-recommends postgresql');
    expect(words).not.toContain('touched');
  });
});

describe('installed npm packages', () => {
  it('are found to be those of package-lock.json, and to be missing where there are none', async () => {
    expect((await run('node', ['scripts/lib/modules-differ.mjs'])).code).toBe(1);
    const bare = await mkdtemp(path.join(tmpdir(), 'twobow-bare-'));
    await copyFile('package-lock.json', path.join(bare, 'package-lock.json'));
    const script = path.resolve('scripts/lib/modules-differ.mjs');
    expect((await run('bash', ['-c', 'cd "$1" && exec node "$2"', '_', bare, script])).code).toBe(0);
    await rm(bare, { recursive: true });
  });
});
