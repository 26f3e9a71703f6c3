import type { NestExpressApplication } from '@nestjs/platform-express';

interface Layer {
  route?: { path: string; methods: Record<string, boolean> };
}

/** A step for every method is middleware (the request log), not a route. */
const mostMethodsOfARoute = 8;

/** Every route that Express really has, as `GET /api/users/:id`; middleware and served files apart. */
export function servedRoutes(app: NestExpressApplication): string[] {
  const { router } = app.getHttpAdapter().getInstance() as { router: { stack: Layer[] } };
  return router.stack.flatMap(({ route }) => {
    const methods = Object.keys(route?.methods ?? {});
    if (!route || methods.length > mostMethodsOfARoute) return [];
    return methods.map((method) => `${method.toUpperCase()} ${route.path}`);
  });
}
