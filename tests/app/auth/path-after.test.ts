import { describe, expect, it } from 'vitest';
import { pathAfter } from '@/app/(auth)/_components/path-after';

describe('where a sign-in leads', () => {
  it('leads to a path of this site', () => {
    expect(pathAfter('/gardens/new?keep=drawing')).toBe('/gardens/new?keep=drawing');
  });

  it('never leads to another site, however it is written (OWASP, unvalidated redirects)', () => {
    for (const bad of [
      'https://elsewhere.example',
      '//elsewhere.example',
      '/\\elsewhere.example',
      'javascript:alert(1)',
      '/a\\b',
      '',
    ])
      expect(pathAfter(bad)).toBe('/gardens');
    expect(pathAfter(undefined)).toBe('/gardens');
  });
});
