// The one lint rule of our own, for oxlint: imports flow in the directions of import-directions.mjs.
import { relative, resolve, sep } from 'node:path';
import { fileURLToPath } from 'node:url';
import { importFault } from './import-directions.mjs';

const root = resolve(fileURLToPath(import.meta.url), '../../..');

const importDirections = {
  create(context) {
    const from = relative(root, context.filename).split(sep).join('/');
    const examine = (node) => {
      const specifier = node.source?.value;
      if (typeof specifier !== 'string') return;
      const message = importFault(from, specifier);
      if (message) context.report({ node, message });
    };
    return {
      ImportDeclaration: examine,
      ImportExpression: examine,
      ExportNamedDeclaration: examine,
      ExportAllDeclaration: examine,
    };
  },
};

export default { meta: { name: 'emberlot' }, rules: { 'import-directions': importDirections } };
