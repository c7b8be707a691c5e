/** The value when it is one of the list, else the fallback: for texts out of an address. */
export function oneOf<Value extends string>(list: readonly Value[], value: string, fallback: Value): Value {
  return list.find((one) => one === value) ?? fallback;
}
