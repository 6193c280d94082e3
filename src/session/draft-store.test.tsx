import { beforeEach, expect, it, vi } from 'vitest';
import { clearDraft, clearDraftsOfUser, loadDraft, saveDraft } from './draft-store';

const key = { userId: 'u1', accountId: 'a1', name: 'new-study' };

beforeEach(() => window.localStorage.clear());

it('gives back what was saved, under its own person and account only', () => {
  saveDraft(key, { name: 'Hazelnuts' });
  expect(loadDraft(key)).toEqual({ name: 'Hazelnuts' });
  expect(loadDraft({ ...key, userId: 'u2' })).toBeUndefined();
  expect(loadDraft({ ...key, accountId: 'a2' })).toBeUndefined();
  clearDraft(key);
  expect(loadDraft(key)).toBeUndefined();
});

it('drops the drafts of one person and leaves everything else', () => {
  saveDraft(key, 1);
  saveDraft({ ...key, accountId: 'a2' }, 2);
  saveDraft({ ...key, userId: 'u10' }, 3);
  window.localStorage.setItem('appearance', 'dark');
  clearDraftsOfUser('u1');
  expect(loadDraft(key)).toBeUndefined();
  expect(loadDraft({ ...key, accountId: 'a2' })).toBeUndefined();
  expect(loadDraft({ ...key, userId: 'u10' })).toBe(3);
  expect(window.localStorage.getItem('appearance')).toBe('dark');
});

it('goes on without drafts where storage is closed or holds something else', () => {
  window.localStorage.setItem('draft/u1/a1/new-study', '{broken');
  expect(loadDraft(key)).toBeUndefined();
  const closed = vi.spyOn(Storage.prototype, 'setItem').mockImplementation(() => {
    throw new DOMException('full', 'QuotaExceededError');
  });
  expect(() => saveDraft(key, 1)).not.toThrow();
  closed.mockRestore();
});
