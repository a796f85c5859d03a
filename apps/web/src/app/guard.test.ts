import { describe, expect, it } from 'vitest';
import { placeAfterSignIn } from './guard.ts';
import { roomAt, rooms, roomsFor } from './rooms.ts';

describe('after signing in', () => {
  it.each([
    ['/stockroom?q=1', '/stockroom?q=1'],
    ['', '/today'],
    ['//elsewhere.example.com', '/today'],
    ['/\\elsewhere.example.com', '/today'],
    ['https://elsewhere.example.com', '/today'],
  ])('%s leads to %s', (to, place) => {
    expect(placeAfterSignIn(new URLSearchParams({ to }))).toBe(place);
  });
});

describe('the rooms', () => {
  it('are found by the place below them, and no other', () => {
    expect(roomAt('/bench/J-0198')?.word).toBe('Bench');
    expect(roomAt('/benches')).toBeUndefined();
  });

  it('lead every role to Today, and leave the books shut to the maker', () => {
    for (const role of ['owner', 'maker', 'bookkeeper'] as const) {
      expect(roomsFor(role)[0]?.word).toBe('Today');
    }
    expect(roomsFor('maker').map((room) => room.word)).not.toContain('Books');
    expect(roomsFor('owner')).toHaveLength(rooms.length);
  });
});
