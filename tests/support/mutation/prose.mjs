import { declareValuePlugin, PluginKind } from '@stryker-mutator/api/plugin';

/**
 * What a clause is called and what an error says are words: no test holds them
 * letter by letter. Texts are left out by the configuration; this leaves out the
 * lists of clauses, and how an error is put together.
 */
const PROSE_PROPERTIES = new Set([
  'citation',
  'useCitation',
  'testCitation',
  'minimumArcRatingCitation',
  'citations',
  'table',
  'standard',
]);
const PROSE_CALLS = new Set(['RangeError', 'Error', 'refuse', 'citation', 'clause']);

function isProse(node) {
  if (node.isFunctionDeclaration()) return node.node.id?.name === 'refuse';
  if (node.isObjectProperty()) return PROSE_PROPERTIES.has(node.node.key.name);
  if (node.isCallExpression() || node.isNewExpression()) {
    return PROSE_CALLS.has(node.node.callee.name);
  }
  return false;
}

export const strykerPlugins = [
  declareValuePlugin(PluginKind.Ignore, 'prose', {
    shouldIgnore(node) {
      if (node.findParent((parent) => parent.isFunctionDeclaration() && isProse(parent)) !== null) {
        return 'How an error is worded.';
      }
      return node.isArrayExpression() && node.findParent(isProse) !== null
        ? 'The names of clauses.'
        : undefined;
    },
  }),
];
