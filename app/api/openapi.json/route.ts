import { describeApi } from '../_http/openapi';
import { json } from '../_http/problem';

export const dynamic = 'force-dynamic';

/** The description of the API in OpenAPI 3.1. */
export function GET(): Response {
  return json(describeApi());
}
