// is-healthy.mjs <address>: exit code 0 where the app answers there that it and its database are well.
const [, , address] = process.argv;

try {
  const answer = await fetch(`${address}/api/health`, { signal: AbortSignal.timeout(10_000) });
  process.exitCode = answer.ok ? 0 : 1;
} catch {
  process.exitCode = 1;
}
