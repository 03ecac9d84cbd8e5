import { describe, expect, it } from 'vitest';
import { can } from '@/lib/access/can';
import { type Action, permissions } from '@/lib/access/permissions';

const actions = Object.keys(permissions) as Action[];

describe('can', () => {
  it('allows the owner everything', () => {
    expect(actions.filter((action) => !can('owner', action))).toEqual([]);
  });
  it('allows the skipper to read, and to write passages', () => {
    const allowed = actions.filter((action) => can('skipper', action));
    expect(allowed).toEqual(['read-boat', 'read-passage', 'write-passage', 'hide-passage']);
  });
  it('allows crew to read', () => {
    expect(actions.filter((action) => can('crew', action))).toEqual(['read-boat', 'read-passage']);
  });
  it('allows a shore contact and a stranger nothing', () => {
    expect(actions.filter((action) => can('shore', action) || can(null, action))).toEqual([]);
  });
});
