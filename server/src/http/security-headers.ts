/** What a page of ours may load, and who may frame it. */
export const contentPolicy: Record<string, string[]> = {
  defaultSrc: ["'none'"],
  scriptSrc: ["'self'"],
  // Radix sets style attributes.
  styleSrc: ["'self'", "'unsafe-inline'"],
  imgSrc: ["'self'", 'data:', 'blob:'],
  fontSrc: ["'self'"],
  connectSrc: ["'self'"],
  manifestSrc: ["'self'"],
  objectSrc: ["'none'"],
  baseUri: ["'none'"],
  formAction: ["'self'"],
  frameAncestors: ["'none'"],
};

const kebab = (name: string) => name.replaceAll(/[A-Z]/g, (letter) => `-${letter.toLowerCase()}`);

/** The headers of the answers that are sent before any hook of the server has run. */
export function earlyHeaders(isHttps: boolean): Record<string, string> {
  return {
    'content-security-policy': Object.entries(contentPolicy)
      .map(([name, values]) => [kebab(name), ...values].join(' '))
      .join(';'),
    'x-content-type-options': 'nosniff',
    'referrer-policy': 'no-referrer',
    'cross-origin-opener-policy': 'same-origin',
    ...(isHttps ? { 'strict-transport-security': 'max-age=31536000; includeSubDomains' } : {}),
  };
}
