/** What one room answers: by name, from a JSON value to an object that is printed as JSON. */
export type Answers = Record<string, (input: unknown) => object>;
