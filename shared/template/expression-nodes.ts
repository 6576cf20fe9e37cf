import type {
  AccessorNode,
  ConstantNode,
  FunctionNode,
  IndexNode,
  MathNode,
  OperatorNode,
  SymbolNode,
} from 'mathjs';
import { FUNCTIONS } from './expression-functions';

/** Operators by the parser's own names. */
export const OPERATORS = new Set([
  'add',
  'subtract',
  'multiply',
  'divide',
  'pow',
  'unaryMinus',
  'smaller',
  'smallerEq',
  'larger',
  'largerEq',
  'equal',
  'unequal',
  'and',
  'or',
  'not',
]);

export const isSymbol = (node: MathNode): node is SymbolNode => node.type === 'SymbolNode';
export const isConstant = (node: MathNode): node is ConstantNode => node.type === 'ConstantNode';

/** The column of `row.column`, or undefined for any other access. */
export function rowColumn(node: AccessorNode): string | undefined {
  const object = node.object;
  const index = node.index as IndexNode & { dotNotation?: boolean };
  const first = index.dimensions[0];
  if (
    !isSymbol(object) ||
    object.name !== 'row' ||
    index.dotNotation !== true ||
    !first ||
    !isConstant(first)
  )
    return undefined;
  const name: unknown = first.value;
  return typeof name === 'string' ? name : undefined;
}

/** Why a node may not stand in an expression, or undefined when it may. */
export function refuseNode(node: MathNode): string | undefined {
  switch (node.type) {
    case 'ConstantNode': {
      const value: unknown = (node as ConstantNode).value;
      return typeof value === 'number' || typeof value === 'string' || typeof value === 'boolean'
        ? undefined
        : 'a constant is a number, a text, true or false.';
    }
    case 'SymbolNode':
    case 'ParenthesisNode':
    case 'ConditionalNode':
      return undefined;
    case 'OperatorNode': {
      const { fn, implicit } = node as OperatorNode & { implicit?: boolean };
      if (implicit) return 'a product is written with *.';
      return OPERATORS.has(fn) ? undefined : `the operator ${fn} is not on the list.`;
    }
    case 'FunctionNode': {
      const called = (node as FunctionNode).fn as MathNode;
      if (!isSymbol(called)) return 'only functions of the list may be called.';
      return Object.hasOwn(FUNCTIONS, called.name)
        ? undefined
        : `the function ${called.name} is not on the list.`;
    }
    case 'AccessorNode':
      return rowColumn(node as AccessorNode) === undefined
        ? 'only row.column may be read with a dot.'
        : undefined;
    case 'IndexNode':
      return undefined;
    default:
      return `${node.type} is not allowed.`;
  }
}
