import type { ConstantNode, MathNode, OperatorNode, ParenthesisNode, SymbolNode } from "mathjs";
import { fail, ok, type Result } from "@/bending/core/result";
import type { Dimension } from "./quantityKind";
import { quantityUnits } from "./quantityUnits";

/** A number in mm, N, kg and degrees, with what it measures. */
export interface Measured {
  readonly value: number;
  readonly dimension: Dimension;
}

const none: Dimension = [0, 0, 0, 0];
const MOST_POWER = 4;
const same = (a: Dimension, b: Dimension): boolean => a.every((exponent, i) => exponent === b[i]);
const combine = (a: Dimension, b: Dimension, sign: 1 | -1): Dimension => [a[0] + sign * b[0], a[1] + sign * b[1], a[2] + sign * b[2], a[3] + sign * b[3]];

/**
 * Works out a parsed expression, and only what this switch names: numbers, units, brackets and the five kinds of sum.
 * Functions, assignments, lists and texts have no case here, so they cannot be reached whatever the grammar accepts.
 */
export function evaluateQuantity(node: MathNode): Result<Measured, string> {
  switch (node.type) {
    case "ConstantNode": {
      const { value } = node as ConstantNode;
      return typeof value === "number" && Number.isFinite(value) ? ok({ value, dimension: none }) : fail("has a number that is too large");
    }
    case "ParenthesisNode":
      return evaluateQuantity((node as ParenthesisNode).content);
    case "SymbolNode": {
      const { name } = node as SymbolNode;
      const unit = quantityUnits.get(name);
      return unit === undefined ? fail(`has "${name}", which is not a unit known here`) : ok({ value: unit.scale, dimension: unit.dimension });
    }
    case "OperatorNode":
      return operate(node as OperatorNode);
    default:
      return fail("is more than a sum of numbers with units");
  }
}

function operate(node: OperatorNode): Result<Measured, string> {
  const [first, second] = node.args;
  if (first === undefined) return fail("lacks a number");
  const left = evaluateQuantity(first);
  if (!left.ok) return left;
  if (second === undefined) {
    if (node.fn === "unaryMinus") return ok({ ...left.value, value: -left.value.value });
    return node.fn === "unaryPlus" ? left : fail(`has "${node.op}", which has no meaning here`);
  }
  if (node.implicit && !startsWithUnit(second)) return fail("has two numbers beside each other: put + or * between them");
  const right = evaluateQuantity(second);
  return right.ok ? join(node, left.value, right.value) : right;
}

/** 7850 kg, 2 mm^2: what may follow a number without a sign between them. */
const startsWithUnit = (node: MathNode): boolean => node.type === "SymbolNode" || (node.type === "OperatorNode" && (node as OperatorNode).fn === "pow" && (node as OperatorNode).args[0]?.type === "SymbolNode");

function join(node: OperatorNode, a: Measured, b: Measured): Result<Measured, string> {
  switch (node.fn) {
    case "add":
    case "subtract":
      if (!same(a.dimension, b.dimension)) return fail(same(a.dimension, none) || same(b.dimension, none) ? "adds a number without a unit to one with a unit: give both their units" : "adds two things that do not measure the same");
      return finite(node.fn === "add" ? a.value + b.value : a.value - b.value, a.dimension);
    case "multiply":
      return finite(a.value * b.value, combine(a.dimension, b.dimension, 1));
    case "divide":
      return b.value === 0 ? fail("divides by zero") : finite(a.value / b.value, combine(a.dimension, b.dimension, -1));
    case "pow": {
      if (!same(b.dimension, none) || !Number.isInteger(b.value) || Math.abs(b.value) > MOST_POWER) return fail(`has a power that is not a whole number up to ${MOST_POWER}`);
      const [l, f, m, g] = a.dimension;
      return finite(a.value ** b.value, [l * b.value, f * b.value, m * b.value, g * b.value]);
    }
    default:
      return fail(`has "${node.op}", which has no meaning here`);
  }
}

const finite = (value: number, dimension: Dimension): Result<Measured, string> =>
  Number.isFinite(value) ? ok({ value, dimension }) : fail("gives a number that is too large");
