const LOOPBACK = new Set(['localhost', '127.0.0.1', '[::1]']);

function sameOriginOrLoopback(target: URL, base: URL): boolean {
  if (target.origin === base.origin) return true;
  return LOOPBACK.has(target.hostname) && LOOPBACK.has(base.hostname) && target.port === base.port;
}

/**
 * Where a sign-in may lead: a path of this application, or an address of the same origin. The names of the
 * loopback interface count as one, since Next calls all of them localhost.
 */
export function redirectTarget(url: string, baseUrl: string): string {
  if (!URL.canParse(url, baseUrl)) return baseUrl;
  const target = new URL(url, baseUrl);
  return sameOriginOrLoopback(target, new URL(baseUrl)) ? target.href : baseUrl;
}

/** A path within this application, or the fallback: never an address elsewhere. */
export function localPath(path: unknown, fallback: string): string {
  if (typeof path !== 'string' || !path.startsWith('/') || !URL.canParse(path, 'http://localhost'))
    return fallback;
  const target = new URL(path, 'http://localhost');
  return target.origin === 'http://localhost' ? target.pathname + target.search : fallback;
}
