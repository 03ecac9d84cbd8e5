import { readdirSync, readFileSync } from 'node:fs';
import path from 'node:path';
import { describe, expect, it } from 'vitest';
import { openApiDocument } from '@/lib/web/openapi/document';

/** "get /api/boats/{boatId}" of every route file; sign-in's own routes are next-auth's and not for programs. */
function routesOfTheTree(): string[] {
  const files = readdirSync('app/api', { recursive: true, encoding: 'utf8' }).filter((file) =>
    file.endsWith('route.ts'),
  );
  return files
    .filter((file) => !file.startsWith('auth'))
    .flatMap((file) => {
      const folder = path.dirname(file).split(path.sep).join('/');
      const address = `/api/${folder}`.replace(/\[(\w+)\]/g, '{$1}');
      const text = readFileSync(path.join('app/api', file), 'utf8');
      const methods = text.matchAll(/^export (?:const|(?:async )?function) (GET|POST|PUT|PATCH|DELETE)\b/gm);
      return [...methods].map((method) => `${method[1]!.toLowerCase()} ${address}`);
    })
    .sort();
}

describe('the OpenAPI document', () => {
  const document = openApiDocument();
  const paths = document.paths ?? {};

  it('describes every JSON route, and none that is not there', () => {
    const described = Object.entries(paths).flatMap(([address, item]) =>
      Object.keys(item as object).map((method) => `${method} ${address}`),
    );
    expect(described.sort()).toEqual(routesOfTheTree());
  });

  it('says of every route who may call it', () => {
    for (const item of Object.values(paths)) {
      for (const operation of Object.values(item as Record<string, { security?: unknown }>)) {
        expect(operation.security).toBeDefined();
      }
    }
  });

  it('resolves each reference it makes', () => {
    const text = JSON.stringify(document);
    const names = [...text.matchAll(/"#\/components\/schemas\/(\w+)"/g)].map((match) => match[1]!);
    expect(names.length).toBeGreaterThan(0);
    for (const name of names) expect(document.components?.schemas).toHaveProperty(name);
  });

  it('names the request and reply of the check with their units', () => {
    const check = JSON.stringify(paths['/api/check']);
    for (const name of [
      'spanM',
      'centreHeightM',
      'carryUpToGustKn',
      'largestLoadShareAtRest',
      'rightingMomentNewtonM',
    ]) {
      expect(check).toContain(`"${name}"`);
    }
    expect(Object.keys(paths['/api/check']?.post?.responses ?? {})).toEqual(
      expect.arrayContaining(['200', '400', '401', '413', '422', '500']),
    );
  });
});
