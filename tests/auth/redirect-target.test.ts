import { describe, expect, it } from 'vitest';
import { localPath, redirectTarget } from '@/lib/auth/redirect-target';

describe('where a sign-in may lead', () => {
  const base = 'http://localhost:3000';

  it.each([
    ['/projects', 'http://localhost:3000/projects'],
    ['http://localhost:3000/projects', 'http://localhost:3000/projects'],
    ['http://127.0.0.1:3000/projects', 'http://127.0.0.1:3000/projects'],
    ['http://127.0.0.1:3001/projects', base],
    ['https://elsewhere.example/projects', base],
    ['//elsewhere.example', base],
    ['javascript:alert(1)', base],
  ])('%s', (url, target) => expect(redirectTarget(url, base)).toBe(target));

  it.each([
    ['/projects/1?tab=a', '/projects/1?tab=a'],
    ['//elsewhere.example', '/projects'],
    ['/\\elsewhere.example', '/projects'],
    ['https://elsewhere.example', '/projects'],
    [undefined, '/projects'],
  ])('as a path: %s', (path, target) => expect(localPath(path, '/projects')).toBe(target));
});
