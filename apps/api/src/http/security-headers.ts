import helmet from 'helmet';
import type { RequestHandler } from 'express';

const common = {
  useDefaults: false, crossOriginOpenerPolicy: { policy: 'same-origin' }, crossOriginResourcePolicy: { policy: 'same-origin' }, referrerPolicy: { policy: 'no-referrer' },
  originAgentCluster: true, xContentTypeOptions: true, xFrameOptions: { action: 'deny' }, xDnsPrefetchControl: true, xDownloadOptions: true, xPermittedCrossDomainPolicies: true, xPoweredBy: true, xXssProtection: true,
} as const;

const self = ["'self'"];
const none = ["'none'"];

/** Headers of every answer: nothing from elsewhere, nothing inline; HSTS where the address is https. */
export function securityHeaders(baseUrl: string): { api: RequestHandler; page: RequestHandler } {
  const strictTransportSecurity = baseUrl.startsWith('https:') ? { maxAge: 31_536_000, includeSubDomains: true } : false;
  const make = (directives: Record<string, string[]>): RequestHandler => helmet({ ...common, strictTransportSecurity, contentSecurityPolicy: { useDefaults: false, directives } });
  return {
    api: make({ defaultSrc: none, baseUri: none, formAction: none, frameAncestors: none, sandbox: [] }),
    page: make({
      defaultSrc: none, scriptSrc: self, styleSrc: self, fontSrc: self, imgSrc: [...self, 'data:', 'blob:'], connectSrc: self, workerSrc: self, manifestSrc: self, objectSrc: none, baseUri: none, formAction: self, frameAncestors: none,
    }),
  };
}
