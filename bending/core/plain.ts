/** The same data without units as types: what a document carries. */
export type Plain<T> = T extends number ? number
  : T extends readonly (infer Entry)[] ? readonly Plain<Entry>[]
  : T extends object ? { readonly [Key in keyof T]: Plain<T[Key]> }
  : T;
