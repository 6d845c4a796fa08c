import type { RequestHandler, Response } from 'express';
import helmet from 'helmet';

export interface SecurityOptions {
  /** True when the public reaches us by https: then browsers are told to insist on it. */
  https: boolean;
  /** Where a payment page may stand besides the provider's own address (the local stand-in of a demo). */
  paymentOrigins?: readonly string[];
}

const stylesFromUs = "style-src-elem 'self'";
const allowedFeatures = 'camera=(self), microphone=(), geolocation=(), payment=(), usb=(), serial=(), bluetooth=(), display-capture=()';

/**
 * Gives the middleware that sets the security headers of every reply. Scripts run from our own files and from the inline
 * scripts with these hashes, nothing else; react-native-web writes style attributes, and pickers show `blob:` pictures.
 */
export function securityHeaders(inlineScriptHashes: readonly string[], options: SecurityOptions): RequestHandler[] {
  const headers = helmet({
    contentSecurityPolicy: {
      useDefaults: false,
      directives: {
        defaultSrc: ["'self'"],
        baseUri: ["'none'"],
        connectSrc: ["'self'", 'blob:'],
        fontSrc: ["'self'"],
        formAction: ["'self'", 'https://checkout.stripe.com', ...(options.paymentOrigins ?? [])],
        frameAncestors: ["'none'"],
        imgSrc: ["'self'", 'blob:'],
        objectSrc: ["'none'"],
        scriptSrc: ["'self'", ...inlineScriptHashes.map((hash) => `'${hash}'`)],
        scriptSrcAttr: ["'none'"],
        styleSrcElem: ["'self'"],
        styleSrcAttr: ["'unsafe-inline'"],
        ...(options.https ? { upgradeInsecureRequests: [] } : {}),
      },
    },
    strictTransportSecurity: options.https ? { maxAge: 365 * 24 * 60 * 60, includeSubDomains: false } : false,
    referrerPolicy: { policy: 'no-referrer' },
    xPoweredBy: true,
  });
  const features: RequestHandler = (_request, response, next) => {
    response.setHeader('Permissions-Policy', allowedFeatures);
    next();
  };
  return [headers, features];
}

/** Lets one page's own inline style elements through; each page has others, and all of them together would swell every reply. */
export function allowInlineStyles(response: Response, hashes: readonly string[]): void {
  const policy = response.getHeader('Content-Security-Policy');
  if (typeof policy !== 'string' || hashes.length === 0) return;
  const allowed = hashes.map((hash) => `'${hash}'`).join(' ');
  response.setHeader('Content-Security-Policy', policy.replace(stylesFromUs, `${stylesFromUs} ${allowed}`));
}
