/** To a millionth of the unit: hides the last digits, in which machines may differ, and nothing that can be measured. */
export const rounded = (value: number): number => {
  const result = Math.round(value * 1e6) / 1e6;
  return result === 0 ? 0 : result;
};
