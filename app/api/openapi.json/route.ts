import { type DescribedRoutes, openApiDocument } from '@/lib/http/openapi';
import { describedRoutes } from './described-routes';

/** The description of this interface, open to everybody. */
export function GET(): Response {
  return Response.json(openApiDocument(describedRoutes as unknown as DescribedRoutes));
}
