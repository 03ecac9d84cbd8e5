import { createReadStream } from 'node:fs';
import path from 'node:path';
import react from '@vitejs/plugin-react';
import { type ViteDevServer, createServer } from 'vite';

const root = path.resolve(import.meta.dirname, '../../..');

/** Serves the map alone on a free port of loopback, with the project's public files. Close it in `afterAll`. */
export async function serveMapPage(): Promise<{ readonly server: ViteDevServer; readonly address: string }> {
  const server = await createServer({
    configFile: false,
    root: path.join(root, 'tests/browser/map-page'),
    publicDir: path.join(root, 'public'),
    cacheDir: path.join(root, '.local/map-page'),
    logLevel: 'error',
    resolve: { alias: [{ find: /^@\//, replacement: `${root}/` }] },
    server: { host: '127.0.0.1', port: 0, watch: null, hmr: false, fs: { allow: [root] } },
    plugins: [
      react(),
      {
        // The build copies the worker into public/; this page does not wait for a build.
        name: 'map-worker',
        configureServer: ({ middlewares }) => {
          middlewares.use('/maplibre-gl-worker.mjs', (_request, response) => {
            response.setHeader('content-type', 'text/javascript');
            createReadStream(path.join(root, 'node_modules/maplibre-gl/dist/maplibre-gl-worker.mjs')).pipe(response);
          });
        },
      },
    ],
  });
  await server.listen();
  const bound = server.httpServer?.address();
  if (!bound || typeof bound === 'string') throw new Error('The map page has no port.');
  return { server, address: `http://127.0.0.1:${bound.port}` };
}
