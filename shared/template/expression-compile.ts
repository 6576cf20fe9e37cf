import type {
  AccessorNode,
  ConditionalNode,
  ConstantNode,
  FunctionNode,
  MathNode,
  OperatorNode,
  ParenthesisNode,
  SymbolNode,
} from 'mathjs';
import { FUNCTIONS } from './expression-functions';
import { isConstant, rowColumn } from './expression-nodes';
import type { ExpressionValue, Scope } from './scope';

type Closure = (scope: Scope) => ExpressionValue;

/** An expression ready to run, and what it reads. */
export interface Compiled {
  source: string;
  run: Closure;
  /** Parameters and derived values by name. */
  symbols: ReadonlySet<string>;
  /** Columns read from the row in hand. */
  columns: ReadonlySet<string>;
  /** `table.column` (or `table.*`) read by the functions over tables. */
  tableColumns: ReadonlySet<string>;
}

const NAMED_FIGURES: ReadonlyMap<string, number> = new Map([['pi', Math.PI]]);

/** An unset value makes whatever is worked out from it unset, so that a constraint says nothing of what is not there. */
export function compileNode(tree: MathNode, source: string): Compiled {
  const symbols = new Set<string>();
  const columns = new Set<string>();
  const tableColumns = new Set<string>();

  function build(node: MathNode): Closure {
    switch (node.type) {
      case 'ConstantNode': {
        const value = (node as ConstantNode).value as unknown as ExpressionValue;
        return () => value;
      }
      case 'ParenthesisNode':
        return build((node as ParenthesisNode).content);
      case 'SymbolNode':
        return buildSymbol((node as SymbolNode).name);
      case 'AccessorNode': {
        const column = rowColumn(node as AccessorNode) ?? '';
        columns.add(column);
        return (scope) => scope.row?.values.get(column) ?? null;
      }
      case 'ConditionalNode': {
        const { condition, trueExpr, falseExpr } = node as ConditionalNode;
        const [ask, yes, no] = [build(condition), build(trueExpr), build(falseExpr)];
        return (scope) => {
          const answer = ask(scope);
          return answer === null ? null : answer === true ? yes(scope) : no(scope);
        };
      }
      case 'OperatorNode':
        return buildOperator(node as OperatorNode);
      default:
        return buildCall(node as FunctionNode);
    }
  }

  function buildSymbol(name: string): Closure {
    const figure = NAMED_FIGURES.get(name);
    if (figure !== undefined) return () => figure;
    if (name === 'index') return (scope) => scope.index ?? null;
    symbols.add(name);
    return (scope) => scope.values.get(name) ?? null;
  }

  function buildOperator(node: OperatorNode): Closure {
    const args = node.args.map(build);
    const first = args[0] as Closure;
    const second = args[1] ?? first;
    if (node.fn === 'and' || node.fn === 'or') {
      const settles = node.fn === 'or';
      return (scope) => {
        const left = first(scope);
        if (left === settles) return settles;
        const right = second(scope);
        if (right === settles) return settles;
        return left === null || right === null ? null : !settles;
      };
    }
    const apply = OPERATIONS[node.fn as string];
    if (!apply) throw new Error(`No meaning for the operator ${String(node.fn)}`);
    return (scope) => {
      const left = first(scope);
      const right = second(scope);
      return left === null || right === null ? null : apply(left, right);
    };
  }

  function buildCall(node: FunctionNode): Closure {
    const name = node.fn.name;
    const called = FUNCTIONS[name];
    const given = node.args;
    if (!called || given.length < called.least || given.length > called.most) {
      throw new Error(`“${source}”: ${name} takes ${called?.least ?? 0} to ${called?.most ?? 0} values`);
    }
    if (called.table !== undefined) {
      const named = (position: number | undefined): string => {
        const argument = position === undefined ? undefined : given[position];
        return argument && isConstant(argument) ? String(argument.value) : '*';
      };
      tableColumns.add(`${named(called.table)}.${named(called.column)}`);
    }
    const args = given.map(build);
    return (scope) => {
      const values = args.map((argument) => argument(scope));
      return !called.takesUnset && values.includes(null) ? null : called.apply(values, scope);
    };
  }

  return { source, run: build(tree), symbols, columns, tableColumns };
}

type Operation = (left: ExpressionValue, right: ExpressionValue) => ExpressionValue;

function onFigures(formula: (a: number, b: number) => number | boolean): Operation {
  return (a, b) => (typeof a === 'number' && typeof b === 'number' ? formula(a, b) : null);
}

const OPERATIONS: Readonly<Record<string, Operation>> = {
  add: onFigures((a, b) => a + b),
  subtract: onFigures((a, b) => a - b),
  multiply: onFigures((a, b) => a * b),
  divide: onFigures((a, b) => a / b),
  pow: onFigures((a, b) => a ** b),
  unaryMinus: onFigures((a) => -a),
  smaller: onFigures((a, b) => a < b),
  smallerEq: onFigures((a, b) => a <= b),
  larger: onFigures((a, b) => a > b),
  largerEq: onFigures((a, b) => a >= b),
  equal: (a, b) => a === b,
  unequal: (a, b) => a !== b,
  not: (a) => (typeof a === 'boolean' ? !a : null),
};
