import { Ajv2020 } from 'ajv/dist/2020.js';
import addFormats from 'ajv-formats';
import { describeApi } from '@/app/api/_http/openapi';
import type { Answer } from './call';
import type { HandlerRow } from './endpoint';

const api = 'api';
const ajv = new Ajv2020({ strict: false, allErrors: true });
addFormats.default(ajv);
let added = false;

/**
 * What of a handler's answer differs from the description of the API: its status, its type or its
 * body; nothing, if all is as described.
 */
export function undescribed({ method, route }: HandlerRow, answer: Answer): string[] {
  if (!added) ajv.addSchema(describeApi(), api);
  added = true;
  const type = answer.headers.get('content-type') ?? '';
  const wanted = answer.status < 400 ? 'application/json' : 'application/problem+json';
  if (type !== wanted) return [`${answer.status} came as ${type}, not as ${wanted}`];
  const validate = ajv.getSchema(
    `${api}#/paths/${pointer(pathOf(route))}/${method.toLowerCase()}/responses/${answer.status}/content/${pointer(type)}/schema`,
  );
  if (!validate) return [`${answer.status} is not described for ${method} ${route}`];
  const fits = validate(JSON.parse(answer.body));
  return fits === true ? [] : [ajv.errorsText(validate.errors)];
}

/** The framework's `[id]` as OpenAPI writes it. */
export function pathOf(route: string): string {
  return route.replaceAll('[', '{').replaceAll(']', '}');
}

function pointer(part: string): string {
  return encodeURIComponent(part.replaceAll('~', '~0').replaceAll('/', '~1'));
}
