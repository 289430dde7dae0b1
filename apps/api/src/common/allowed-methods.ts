import type { Request } from 'express';

interface RouteLayer {
  route?: { path: unknown; methods: Record<string, boolean> };
  match(path: string): boolean;
}

/** The methods that the address of a request answers, read from Express's own router; empty for an unknown address. */
export function allowedMethods(request: Request): string[] {
  const layers = request.app.router.stack as unknown as RouteLayer[];
  const methods = layers
    .filter((layer) => layer.route && layer.match(request.path))
    .flatMap((layer) => Object.keys(layer.route?.methods ?? {}))
    .map((method) => method.toUpperCase());
  return [...new Set(methods)].sort();
}
