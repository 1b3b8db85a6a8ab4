const YEAR_S = 365 * 24 * 60 * 60;

const CONTENT_POLICY = {
  'default-src': "'self'",
  'script-src': "'self'",
  // Controls write inline styles and style elements: positions, scroll locks, chart sizes.
  'style-src': "'self' 'unsafe-inline'",
  'img-src': "'self' data: blob:",
  'object-src': "'none'",
  'base-uri': "'none'",
  'form-action': "'self'",
  'frame-ancestors': "'none'",
};

/** Set on every answer, static files included. @param {import('./settings.mjs').Settings} settings */
export function securityHeaders({ origin }) {
  return {
    'content-security-policy': contentPolicy(),
    'x-content-type-options': 'nosniff',
    'referrer-policy': 'strict-origin-when-cross-origin',
    'permissions-policy': 'camera=(), geolocation=(), microphone=(), payment=(), usb=()',
    'cross-origin-opener-policy': 'same-origin',
    'cross-origin-resource-policy': 'same-origin',
    ...(origin.protocol === 'https:' ? { 'strict-transport-security': `max-age=${YEAR_S}` } : {}),
  };
}

/**
 * Our policy, with the scripts that a rendered page's own policy names by their hashes.
 * @param {string} [pagePolicy] what Astro would send
 */
export function contentPolicy(pagePolicy = '') {
  const directives = pagePolicy.split(';').map((directive) => directive.trim().split(/\s+/));
  const scripts = directives.find(([name]) => name === 'script-src')?.slice(1);
  return Object.entries({ ...CONTENT_POLICY, ...(scripts && { 'script-src': scripts.join(' ') }) })
    .map(([name, sources]) => `${name} ${sources}`)
    .join('; ');
}

/**
 * Sets the headers, and at the last moment fits in what the page itself asked for.
 * @param {import('node:http').ServerResponse} res @param {Record<string, string>} headers
 */
export function secureResponse(res, headers) {
  for (const [name, value] of Object.entries(headers)) res.setHeader(name, value);
  const writeHead = res.writeHead.bind(res);
  /** Astro gives an object of lower-case names, whose values win over those set before. */
  res.writeHead = (status, ...rest) => {
    const own = rest.at(-1);
    if (typeof own === 'object' && own !== null && !Array.isArray(own)) {
      for (const [name, value] of Object.entries(own)) res.setHeader(name, value);
      rest.pop();
      const pagePolicy = own['content-security-policy'];
      if (pagePolicy) res.setHeader('content-security-policy', contentPolicy(pagePolicy));
    }
    // A page is made for one reader; a browser may keep it but has to ask before showing it again.
    if (!res.hasHeader('cache-control')) res.setHeader('cache-control', 'private, no-cache');
    return writeHead(status, ...rest);
  };
}
