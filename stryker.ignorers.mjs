import { declareValuePlugin, PluginKind } from '@stryker-mutator/api/plugin';

/** What a clause is called and what an error says are words: no test holds them letter by letter. */
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

function isProse(path) {
  if (path.isObjectProperty()) return PROSE_PROPERTIES.has(path.node.key.name);
  if (path.isCallExpression() || path.isNewExpression()) {
    return PROSE_CALLS.has(path.node.callee.name);
  }
  return false;
}

export const strykerPlugins = [
  declareValuePlugin(PluginKind.Ignore, 'prose', {
    shouldIgnore(path) {
      const isText = path.isStringLiteral() || path.isTemplateLiteral();
      return isText && path.findParent(isProse) !== null
        ? 'Prose or the name of a clause.'
        : undefined;
    },
  }),
];
