import type { RequestHandler } from 'express';
import helmet from 'helmet';

const self = ["'self'"];
const none = ["'none'"];

const headers = helmet({
  contentSecurityPolicy: {
    useDefaults: false,
    directives: {
      defaultSrc: none,
      scriptSrc: self,
      styleSrc: self,
      imgSrc: ["'self'", 'blob:', 'data:'],
      fontSrc: self,
      connectSrc: self,
      workerSrc: self,
      baseUri: none,
      formAction: self,
      frameAncestors: none,
    },
  },
  strictTransportSecurity: false,
  referrerPolicy: { policy: 'same-origin' },
});

const transportSecurity = helmet.strictTransportSecurity({ maxAge: 31_536_000 });

/** The headers of every answer. HSTS only over https: sent elsewhere it would lock a local installation out. */
export const securityHeaders: RequestHandler = (request, response, next) => {
  headers(request, response, (error?: unknown) => {
    if (error !== undefined || !request.secure) return next(error);
    transportSecurity(request, response, () => next());
  });
};
