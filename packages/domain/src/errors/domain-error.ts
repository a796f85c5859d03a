/** What the domain refuses. The sentence is for the person at the screen and says what to do. */
export class DomainError extends Error {
  override readonly name: string = 'DomainError';
}

/** One input makes no sense; `field` names it as the caller spelled it ('cornerRadiusMm'). */
export class InvalidInput extends DomainError {
  override readonly name = 'InvalidInput';
  readonly field: string;

  constructor(field: string, sentence: string) {
    super(sentence);
    this.field = field;
  }
}

/** The input is sound, but nothing sensible can be worked out from it. */
export class NotWorkable extends DomainError {
  override readonly name = 'NotWorkable';
}
