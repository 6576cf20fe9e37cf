import { create, parseDependencies } from 'mathjs/number';
import type { MathNode } from 'mathjs';
import { compileNode, type Compiled } from './expression-compile';
import { refuseNode } from './expression-nodes';

/** Longest source and deepest nesting an expression may have; more is a slip in a template, not a formula. */
const MAX_SOURCE = 600;
const MAX_NODES = 200;
const MAX_DEPTH = 24;

export class ExpressionError extends Error {}

/** mathjs lends its parser only: nothing of it ever evaluates. */
const { parse } = create(parseDependencies ?? {});

const compiled = new Map<string, Compiled>();

/**
 * Compiles an expression of a template to a closure over a scope.
 * Allowed: constants, symbols, `row.column`, + − * / ^, comparison, and/or/not, `? :`, parentheses and the short list of functions.
 * @throws ExpressionError naming what is not allowed: a fault of the template
 */
export function compileExpression(source: string): Compiled {
  const known = compiled.get(source);
  if (known) return known;
  if (source.length > MAX_SOURCE)
    throw new ExpressionError(`The expression is longer than ${MAX_SOURCE} characters.`);
  let tree: MathNode;
  try {
    tree = parse(source);
  } catch (cause) {
    throw new ExpressionError(
      `“${source}” cannot be read: ${cause instanceof Error ? cause.message : 'unknown'}`,
    );
  }
  let nodes = 0;
  const walk = (node: MathNode, depth: number): void => {
    nodes += 1;
    if (nodes > MAX_NODES) throw new ExpressionError(`“${source}” has more than ${MAX_NODES} parts.`);
    if (depth > MAX_DEPTH) throw new ExpressionError(`“${source}” is nested deeper than ${MAX_DEPTH}.`);
    const refusal = refuseNode(node);
    if (refusal) throw new ExpressionError(`“${source}”: ${refusal}`);
    node.forEach((child) => walk(child, depth + 1));
  };
  walk(tree, 0);
  const result = compileNode(tree, source);
  compiled.set(source, result);
  return result;
}
