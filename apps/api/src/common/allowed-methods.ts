import type { Request } from 'express';

interface RouteLayer {
  route?: { path: unknown; methods: Record<string, boolean> };
  match(path: string): boolean;
}

/** A route of a controller has one method; what answers to more is middleware. */
const ROUTE_METHODS = 1;

/** The methods that the address of a request answers, read from Express's own router; empty for an unknown address. */
export function allowedMethods(request: Request): string[] {
  const layers = request.app.router.stack as unknown as RouteLayer[];
  const methods = layers
    .map((layer) => (layer.match(request.path) ? Object.keys(layer.route?.methods ?? {}) : []))
    .filter((methods) => methods.length <= ROUTE_METHODS)
    .flat()
    .map((method) => method.toUpperCase());
  return [...new Set(methods)].sort();
}
