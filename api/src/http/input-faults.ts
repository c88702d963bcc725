import type { z } from 'zod/mini';
import type { InputFault } from '../fault.ts';

type Issue = z.core.$ZodIssue;

const pointerOf = (root: string, path: readonly PropertyKey[]): string =>
  [root, ...path.map((step) => String(step).replaceAll('~', '~0').replaceAll('/', '~1'))].join('/');

const KINDS: Readonly<Record<string, string>> = {
  string: 'text',
  number: 'a number',
  int: 'a whole number',
  boolean: 'true or false',
  array: 'a list',
  tuple: 'a list',
  object: 'an object',
  record: 'an object',
  null: 'empty',
};
const FORMATS: Readonly<Record<string, string>> = {
  uuid: 'must be an id (a UUID)',
  email: 'must be an e-mail address, like name@example.org',
  datetime: 'must be a time in UTC, like 2030-01-31T12:00:00Z',
  date: 'must be a date, like 2030-01-31',
};

const unit = (origin: string, count: number | bigint): string =>
  origin === 'string'
    ? ` character${count === 1 ? '' : 's'}`
    : origin === 'array'
      ? ` item${count === 1 ? '' : 's'}`
      : '';

function sentence(name: string, issue: Issue): string {
  switch (issue.code) {
    case 'invalid_type':
      return issue.input === undefined && 'input' in issue
        ? `${name} is missing.`
        : `${name} must be ${KINDS[issue.expected] ?? issue.expected}.`;
    case 'too_small':
      return issue.origin === 'string' && issue.minimum === 1
        ? `Enter ${name}.`
        : `${name} must be ${issue.inclusive === false ? 'more than' : 'at least'} ${issue.minimum}${unit(issue.origin, issue.minimum)}.`;
    case 'too_big':
      return `${name} must be ${issue.inclusive === false ? 'less than' : 'at most'} ${issue.maximum}${unit(issue.origin, issue.maximum)}.`;
    case 'invalid_format':
      return `${name} ${FORMATS[issue.format] ?? 'is not written as it should be'}.`;
    case 'invalid_value':
      return `${name} must be one of ${issue.values.map(String).join(', ')}.`;
    case 'unrecognized_keys':
      return `${name} has fields that are not known: ${issue.keys.join(', ')}.`;
    case 'invalid_union':
    case 'invalid_key':
    case 'invalid_element':
    case 'not_multiple_of':
    case 'custom':
      return `${name} does not fit.`;
  }
}

/** Every fault of a schema as pointer, code and a sentence; an unknown field is a fault of its own. */
export function inputFaults(root: '' | '/query', issues: readonly Issue[]): InputFault[] {
  return issues.flatMap((issue) => {
    if (issue.code === 'unrecognized_keys') {
      return issue.keys.map((key) => ({
        pointer: pointerOf(root, [...issue.path, key]),
        code: 'UNKNOWN_FIELD',
        message: `${key} is not a field that is known here.`,
      }));
    }
    const last = issue.path.at(-1);
    const name = last === undefined ? 'The body' : typeof last === 'number' ? `Item ${last + 1}` : String(last);
    return [{ pointer: pointerOf(root, issue.path), code: issue.code.toUpperCase(), message: sentence(name, issue) }];
  });
}
