import { InvalidInput } from '../../errors/domain-error.ts';

/** A drawing that cannot be read; the sentence says what is wrong in it and what to do. */
export const refusal = (sentence: string): InvalidInput => new InvalidInput('drawing', sentence);

/** What a drawing may hold at most. */
export const mostCharacters = 5_000_000;
export const mostElements = 50_000;
export const mostVertices = 100_000;
export const mostCurves = 2_000;
export const deepest = 100;
