import path from 'node:path';
import { mayImport } from './may-import.mjs';

const root = path.resolve(import.meta.dirname, '../..');

/** ESLint rule: reports every import that no arrow of arrows.mjs allows. */
export const arrowsRule = {
  meta: {
    type: 'problem',
    schema: [],
    messages: { wrong: '{{from}} must not import {{to}} (scripts/lint/arrows.mjs).' },
  },
  create(context) {
    const file = path.relative(root, context.filename).split(path.sep).join('/');
    const check = (source) => {
      if (typeof source?.value !== 'string') return;
      const { allowed, from, to } = mayImport(file, source.value);
      if (!allowed) context.report({ node: source, messageId: 'wrong', data: { from, to } });
    };
    return {
      ImportDeclaration: (node) => check(node.source),
      ExportAllDeclaration: (node) => check(node.source),
      ExportNamedDeclaration: (node) => check(node.source),
      ImportExpression: (node) => check(node.source),
      TSImportType: (node) => check(node.source ?? node.argument?.literal),
      CallExpression: (node) => node.callee.name === 'require' && check(node.arguments[0]),
    };
  },
};
