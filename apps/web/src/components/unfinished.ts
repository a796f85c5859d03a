/** What a form begins with: any part of its body may still be missing. */
export type Unfinished<Value> = Value extends readonly (infer Item)[]
  ? Unfinished<Item>[]
  : Value extends object
    ? { [Key in keyof Value]?: Unfinished<Value[Key]> | undefined }
    : Value | undefined;
