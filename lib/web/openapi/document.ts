import { OpenApiGeneratorV31, OpenAPIRegistry } from '@asteasolutions/zod-to-openapi';
import { registerBoatPaths } from '@/lib/web/openapi/boat-paths';
import { registerCheckPaths } from '@/lib/web/openapi/check-paths';
import { registerHealthPaths } from '@/lib/web/openapi/health-paths';
import { registerPassagePaths } from '@/lib/web/openapi/passage-paths';

const sessionCookie = 'next-auth.session-token';

/** The OpenAPI description of every JSON route, made from the schemas that the routes themselves use. */
export function openApiDocument() {
  const registry = new OpenAPIRegistry();
  registry.registerComponent('securitySchemes', 'session', {
    type: 'apiKey',
    in: 'cookie',
    name: sessionCookie,
    description: `The cookie of a signed-in browser; over https its name is __Secure-${sessionCookie}.`,
  });
  registry.registerComponent('securitySchemes', 'personalToken', {
    type: 'http',
    scheme: 'bearer',
    description: 'A personal token, made under Account.',
  });
  registerCheckPaths(registry);
  registerBoatPaths(registry);
  registerPassagePaths(registry);
  registerHealthPaths(registry);
  return new OpenApiGeneratorV31(registry.definitions).generateDocument({
    openapi: '3.1.0',
    info: {
      title: 'Twobow',
      version: '1',
      description:
        'Plans coastal passages for small shunting craft. Every change must come from our own pages or carry a personal token. Wrong input is answered by problem details (RFC 9457) that name each field.',
    },
    servers: [{ url: '/' }],
  });
}
