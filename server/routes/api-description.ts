import { Router } from 'express';
import swaggerUi from 'swagger-ui-express';
import { securityHeaders } from '../http/security-headers';

interface Options {
  readonly document: object;
  readonly https: boolean;
}

/** /openapi.json, and /docs to read and try it. Swagger UI writes its own styles: only it may. */
export function apiDescription({ document, https }: Options): Router {
  const router = Router();
  const json = JSON.stringify(document);
  router.get('/openapi.json', (_request, response) => {
    response.setHeader('Cache-Control', 'no-cache');
    response.type('application/json').send(json);
  });
  router.use('/docs', securityHeaders({ styles: ["'unsafe-inline'"], https }), swaggerUi.serve);
  router.get(
    '/docs/',
    swaggerUi.setup(document, {
      customSiteTitle: 'Stepwell API',
      swaggerOptions: { validatorUrl: null, persistAuthorization: false },
    }),
  );
  return router;
}
