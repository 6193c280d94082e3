import { describe, expect, it } from 'vitest';
import { addressAfterCreating } from './return-address';

const created = { collection: 'laminates' as const, id: '0190-1' };
const options = { basePath: '/a/nuts', otherwise: '/a/nuts/walls/0190-1' };

describe('addressAfterCreating', () => {
  it('goes back with what was made, keeping what the address said', () => {
    expect(addressAfterCreating(created, { ...options, returnTo: '/a/nuts/studies/new?step=2' })).toBe(
      '/a/nuts/studies/new?step=2&created=laminates%3A0190-1',
    );
  });

  it.each([
    undefined,
    '',
    'https://elsewhere.example',
    '//elsewhere.example',
    '/a/other/studies',
    '/a/nuts//x',
  ])('does not follow %s', (returnTo) => {
    expect(addressAfterCreating(created, { ...options, returnTo })).toBe(options.otherwise);
  });
});
