import type { Contract, RoutePolicy } from '@embertally/shared/contracts/contract';
import { problemSchema } from '@embertally/shared/contracts/problem';
import { z } from 'zod/mini';

type Json = Record<string, unknown>;

const schemaOf = (schema: z.ZodMiniType, io: 'input' | 'output'): Json =>
  z.toJSONSchema(schema, { io, unrepresentable: 'any' });

function parameters(place: 'path' | 'query', schema: z.ZodMiniType | undefined): Json[] {
  if (schema === undefined) return [];
  const described = schemaOf(schema, 'input') as { properties?: Record<string, Json>; required?: string[] };
  return Object.entries(described.properties ?? {}).map(([name, field]) => ({
    name,
    in: place,
    required: place === 'path' || (described.required ?? []).includes(name),
    schema: field,
  }));
}

export function policyInWords(policy: RoutePolicy): string {
  switch (policy.kind) {
    case 'public':
      return `Open to everyone: ${policy.why}.`;
    case 'signed-in':
      return 'For anyone signed in.';
    case 'organisation':
      return `For members who may “${policy.action}” in their organisation.`;
    case 'site':
      return `For people whose role on the site allows “${policy.action}”; anyone else is told 404.`;
  }
}

const problem = (description: string): Json => ({
  description,
  content: { 'application/problem+json': { schema: { $ref: '#/components/schemas/Problem' } } },
});

/** The body of an operation: JSON by its schema, or a file of the types it takes. */
function requestBody(contract: Contract): Json {
  const body = contract.bodyShape ?? contract.body;
  if (body !== undefined) {
    return { requestBody: { required: true, content: { 'application/json': { schema: schemaOf(body, 'input') } } } };
  }
  if (contract.upload === undefined) return {};
  const content = Object.fromEntries(Object.keys(contract.upload).map((type) => [type, {}]));
  return { requestBody: { required: true, content } };
}

function responses(contract: Contract): Json {
  const content =
    contract.response !== undefined
      ? { content: { 'application/json': { schema: schemaOf(contract.response, 'output') } } }
      : contract.media !== undefined
        ? { content: { [contract.media]: {} } }
        : {};
  const signedIn = contract.policy.kind !== 'public';
  const limited = contract.policy.kind === 'site' || contract.policy.kind === 'organisation';
  return {
    [contract.status]: { description: 'Done', ...content },
    ...(signedIn ? { 401: problem('Not signed in') } : {}),
    ...(limited ? { 403: problem('The role does not allow it') } : {}),
    ...(limited && contract.params !== undefined ? { 404: problem('Not there, or not yours to know of') } : {}),
    ...(contract.ifMatch ? { 412: problem('Changed meanwhile'), 428: problem('If-Match is missing') } : {}),
    ...(contract.body ? { 415: problem('Not JSON'), 422: problem('Faults, each with its place') } : {}),
    ...(contract.upload
      ? {
          413: problem('Too large'),
          415: problem('Not of a type that is taken, or not what it says'),
          422: problem('Faults, each with its place'),
          507: problem('No room left'),
        }
      : {}),
    default: problem('Any other refusal'),
  };
}

function operation(contract: Contract): Json {
  const headers = [
    ...(contract.ifMatch ? [{ name: 'If-Match', in: 'header', required: true, schema: { type: 'string' } }] : []),
    ...(contract.method === 'GET'
      ? []
      : [{ name: 'X-Embertally', in: 'header', required: true, schema: { const: 'web' } }]),
  ];
  return {
    operationId: contract.id,
    summary: contract.summary,
    description: policyInWords(contract.policy),
    parameters: [...parameters('path', contract.params), ...parameters('query', contract.query), ...headers],
    ...requestBody(contract),
    responses: responses(contract),
    security: contract.policy.kind === 'public' ? [] : [{ session: [] }],
    'x-policy': contract.policy,
  };
}

/** The API as OpenAPI 3.1, made of the contracts that also validate. */
export function describeApi(contracts: readonly Contract[]): { openapi: string } & Json {
  const paths: Record<string, Json> = {};
  for (const contract of contracts) {
    const path = contract.path.replace(/:(\w+)/g, '{$1}');
    paths[path] = { ...paths[path], [contract.method.toLowerCase()]: operation(contract) };
  }
  return {
    openapi: '3.1.0',
    info: { title: 'Embertally', version: '1', description: 'The fire-load book of a building.' },
    paths,
    components: {
      schemas: { Problem: schemaOf(problemSchema, 'output') },
      securitySchemes: { session: { type: 'apiKey', in: 'cookie', name: '__Host-sid' } },
    },
  };
}
