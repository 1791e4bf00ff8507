import { createRequire } from 'node:module';
import path from 'node:path';
import { pathToFileURL } from 'node:url';

/**
 * Stryker has no mutator of numbers, and figures are what `hazard/` is for: a
 * whole number becomes the next one, a fraction grows by a hundredth. The list
 * of mutators is no public interface: look here first when Stryker is raised.
 */
const figure = {
  name: 'Figure',
  *mutate(node) {
    if (!node.isNumericLiteral() || node.parentPath.isTSLiteralType()) return;
    // The name of a row is no expression.
    if (node.key === 'key' && !node.parent.computed) return;
    const { value } = node.node;
    yield { type: 'NumericLiteral', value: Number.isInteger(value) ? value + 1 : value + 0.01 };
  },
};

const here = createRequire(import.meta.url);
const core = createRequire(here.resolve('@stryker-mutator/core/package.json'));
const instrumenter = path.dirname(core.resolve('@stryker-mutator/instrumenter'));
const { allMutators } = await import(
  pathToFileURL(path.join(instrumenter, 'mutators/mutate.js')).href
);
if (!allMutators.some(({ name }) => name === figure.name)) allMutators.push(figure);

export const strykerPlugins = [];
