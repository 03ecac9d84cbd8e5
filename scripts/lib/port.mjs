// port.mjs free                    prints a free port of loopback
// port.mjs is-free <host> <port>   exit code 0 where a server may listen there, 1 where it is taken, 2 for another reason
import { createServer } from 'node:net';

const [, , verb, host, port] = process.argv;
const server = createServer();

server.once('error', (error) => {
  process.exitCode = error.code === 'EADDRINUSE' ? 1 : 2;
  if (process.exitCode === 2) process.stderr.write(`${error.message}\n`);
});

if (verb === 'free') {
  server.listen(0, '127.0.0.1', () => {
    process.stdout.write(`${server.address().port}\n`);
    server.close();
  });
} else {
  server.listen(Number(port), host, () => server.close());
}
