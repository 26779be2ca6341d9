import type { OpenAPIObject } from '@nestjs/swagger';
import { Problem } from '@ellwand/shared/records/problem';
import { z } from 'zod';

const methods = ['get', 'post', 'put', 'patch', 'delete'] as const;

/** Every route may refuse, and does so in one form: said once here instead of at each route. */
export function problemResponses(document: OpenAPIObject): OpenAPIObject {
  const schema = Object.fromEntries(
    Object.entries(z.toJSONSchema(Problem)).filter(([key]) => key !== '$schema'),
  );
  const schemas = { ...document.components?.schemas, Problem: schema };
  for (const path of Object.values(document.paths)) {
    for (const method of methods) {
      const operation = path[method];
      if (operation) operation.responses = { ...operation.responses, default: refusal };
    }
  }
  return { ...document, components: { ...document.components, schemas } };
}

const refusal = {
  description: 'Refused: problem details (RFC 9457) with a stable `code`',
  content: { 'application/problem+json': { schema: { $ref: '#/components/schemas/Problem' } } },
};
