import { compute } from '@hidewright/domain';
import { describe, expect, it } from 'vitest';

const ask = (text: string) => compute('creditor-reference', { text });

describe('creditor references (ISO 11649)', () => {
  // Checked with python-stdnum 1.18 (stdnum.iso11649).
  it.each(['RF18539007547034', 'RF471234567890', 'RF78INV2024001', 'RF262320'])(
    '%s is right, and is what its own number gives',
    (reference) => {
      expect(ask(reference)).toEqual({ valid: true, reference });
      expect(ask(reference.slice(4))).toEqual({ valid: false, reference });
    },
  );

  it.each(['RF19 2320', 'RF35C4'])('%s is wrong', (text) => {
    expect(ask(text)).toEqual({ valid: false, reference: null });
  });
});
