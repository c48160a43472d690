/**
 * What an expression comes to (NISTIR 6556 §3.3.2.3, §3.3.2.4): angles in degrees, logic 1 or 0 with everything but 0 true,
 * FIX down and FUP up. What the report leaves open (MOD of negative numbers, ROUND of exactly a half) is not guessed.
 * Out: a finite number, never -0; or why there is none.
 */
import { WHOLE_NUMBER } from '../base/tolerances.ts';
import { degrees, radians } from '../base/units.ts';
import type { Binary, Expression, Unary } from './expression.ts';
import { parameterNumber, parameterValue, type ParameterKey, type Parameters } from './parameters.ts';

export function evaluate(expression: Expression, parameters: Parameters): number | string {
  const value = valueOf(expression, parameters);
  if (typeof value === 'string') {
    return value;
  }
  if (!Number.isFinite(value)) {
    return 'a result that no number holds';
  }
  return value === 0 ? 0 : value;
}

/** Which parameter the left side of a setting names. */
export function keyOf(target: Expression, parameters: Parameters): ParameterKey | { readonly fault: string } {
  if (target.kind === 'named') {
    return target.name;
  }
  const number = target.kind === 'parameter' ? evaluate(target.of, parameters) : 'no parameter';
  const key = typeof number === 'number' ? parameterNumber(number) : number;
  return typeof key === 'number' ? key : { fault: key };
}

function valueOf(expression: Expression, parameters: Parameters): number | string {
  switch (expression.kind) {
    case 'number':
      return expression.value;
    case 'named':
      return parameterValue(parameters, expression.name);
    case 'parameter': {
      const key = keyOf(expression, parameters);
      return typeof key === 'object' ? key.fault : parameterValue(parameters, key);
    }
    case 'unary': {
      const value = evaluate(expression.of, parameters);
      return typeof value === 'string' ? value : unary(expression.name, value);
    }
    case 'atan':
    case 'binary': {
      const isAngle = expression.kind === 'atan';
      const left = evaluate(isAngle ? expression.over : expression.left, parameters);
      const right = evaluate(isAngle ? expression.under : expression.right, parameters);
      if (typeof left === 'string' || typeof right === 'string') {
        return typeof left === 'string' ? left : right;
      }
      return isAngle ? angle(left, right) : binary(expression.op, left, right);
    }
  }
}

function angle(over: number, under: number): number | string {
  return over === 0 && under === 0 ? 'ATAN[0]/[0] is no angle' : degrees(Math.atan2(over, under));
}

function unary(name: Unary, x: number): number | string {
  switch (name) {
    case 'ABS':
      return Math.abs(x);
    case 'ACOS':
      return Math.abs(x) > 1 ? outside(name, x, '-1 to 1') : degrees(Math.acos(x));
    case 'ASIN':
      return Math.abs(x) > 1 ? outside(name, x, '-1 to 1') : degrees(Math.asin(x));
    case 'COS':
      return Math.cos(radians(x));
    case 'EXP':
      return Math.exp(x);
    case 'FIX':
      return Math.floor(x);
    case 'FUP':
      return Math.ceil(x);
    case 'LN':
      return x > 0 ? Math.log(x) : outside(name, x, 'more than zero');
    case 'ROUND':
      return Math.abs(x) % 1 === 0.5
        ? `ROUND[${String(x)}]: to which side a half goes is not settled`
        : Math.round(x);
    case 'SIN':
      return Math.sin(radians(x));
    case 'SQRT':
      return x >= 0 ? Math.sqrt(x) : outside(name, x, 'zero or more');
    case 'TAN':
      return Math.tan(radians(x));
  }
}

function outside(name: Unary, x: number, range: string): string {
  return `${name}[${String(x)}]: it wants ${range}`;
}

function binary(op: Binary, a: number, b: number): number | string {
  switch (op) {
    case '**':
      return a < 0 && !Number.isInteger(b)
        ? `${String(a)} to the power of ${String(b)} is no number`
        : a ** b;
    case '*':
      return a * b;
    case '/':
      return b === 0 ? 'a division by zero' : a / b;
    case 'MOD':
      return a < 0 || b <= 0
        ? `${String(a)} MOD ${String(b)}: with numbers below zero, controllers differ`
        : a % b;
    case '+':
      return a + b;
    case '-':
      return a - b;
    default:
      return isCompared(op) && a !== b && Math.abs(a - b) <= WHOLE_NUMBER
        ? `${String(a)} ${op} ${String(b)}: so near to each other that controllers differ`
        : truth(op, a, b)
          ? 1
          : 0;
  }
}

/** Some take numbers that differ by 0.0001 for the same (from memory). */
function isCompared(op: Binary): boolean {
  return op !== 'OR' && op !== 'XOR' && op !== 'AND';
}

function truth(op: Binary, a: number, b: number): boolean {
  switch (op) {
    case 'OR':
      return a !== 0 || b !== 0;
    case 'XOR':
      return (a !== 0) !== (b !== 0);
    case 'AND':
      return a !== 0 && b !== 0;
    case 'EQ':
      return a === b;
    case 'NE':
      return a !== b;
    case 'GT':
      return a > b;
    case 'GE':
      return a >= b;
    case 'LT':
      return a < b;
    default:
      return a <= b;
  }
}
