import type { ConstantNode, FunctionNode, MathNode, OperatorNode, SymbolNode } from 'mathjs';
import { ArithmeticError } from '../errors/arithmetic-error.js';
import { math } from './formula-library.js';

const longest = 500;
const operators: ReadonlySet<string> = new Set(['+', '-', '*', '/', '^']);

/** Functions by the name they have in a formula. */
const functions: ReadonlySet<string> = new Set(['sqrt', 'abs', 'min', 'max', 'exp', 'ln', 'log10']);

/**
 * Reads a formula and refuses everything that is not plain arithmetic: the library's language knows assignments,
 * property access, strings, matrices and functions of its own, none of which may reach a test plan.
 *
 * @param text the formula
 * @returns its tree, holding numbers, names, + − * / ^, brackets and the listed functions only
 * @throws ArithmeticError `judge_formula_too_long`, `judge_formula_unreadable`, `judge_formula_forbidden`
 */
export function checkFormula(text: string): MathNode {
  if (text.length > longest) throw new ArithmeticError('judge_formula_too_long', { most: longest });
  const root = parsed(text);
  root.traverse((node, path, parent) => checkNode(node, path, parent, text));
  return root;
}

/**
 * Names that stand for values in a formula.
 *
 * @param root a checked tree
 * @returns each name once, functions left out
 */
export function namesIn(root: MathNode): readonly string[] {
  const names = new Set<string>();
  root.traverse((node, path) => {
    if (isSymbol(node) && path !== 'fn') names.add(node.name);
  });
  return [...names];
}

function parsed(text: string): MathNode {
  try {
    return math.parse(text.replace(/[·×]/g, '*').replace(/−/g, '-'));
  } catch (error) {
    if (error instanceof SyntaxError) throw new ArithmeticError('judge_formula_unreadable', { text });
    throw error;
  }
}

function checkNode(node: MathNode, path: string, parent: MathNode | null, text: string): void {
  const forbid = (part: string): never => {
    throw new ArithmeticError('judge_formula_forbidden', { part });
  };
  switch (node.type) {
    case 'ParenthesisNode':
      return;
    case 'SymbolNode':
      if (path === 'fn' && parent !== null && isFunction(parent)) return;
      if (!/^[A-Za-z_µΩ°℃][\w²³µΩ/]*$/u.test((node as SymbolNode).name)) forbid((node as SymbolNode).name);
      return;
    case 'ConstantNode': {
      const { value } = node as ConstantNode<string | number | bigint | boolean | null | undefined>;
      // An empty formula is parsed as the constant undefined.
      if (value === undefined) throw new ArithmeticError('judge_formula_unreadable', { text });
      if (typeof value !== 'number') forbid(String(value));
      return;
    }
    case 'OperatorNode':
      if (!operators.has((node as OperatorNode).op)) forbid((node as OperatorNode).op);
      return;
    case 'FunctionNode':
      if (!functions.has((node as FunctionNode).fn.name)) forbid((node as FunctionNode).fn.name);
      return;
    default:
      forbid(node.toString());
  }
}

const isSymbol = (node: MathNode): node is SymbolNode => node.type === 'SymbolNode';
const isFunction = (node: MathNode): node is FunctionNode => node.type === 'FunctionNode';
