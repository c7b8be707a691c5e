import { Select } from "@/components/ui/Select";
import { choiceOptions, choiceTitles } from "@/lib/calculator/choiceLabels";
import { calculatorChoices, type ChoiceKey } from "@/lib/calculator/choices";

interface ChoiceInputProps {
  readonly place: string;
  readonly name: ChoiceKey;
  readonly value: string;
  readonly onChange: (value: string) => void;
}

export function ChoiceInput({ place, name, value, onChange }: ChoiceInputProps) {
  const values: readonly string[] = calculatorChoices[name];
  return <Select id={`${place}-${name}`} label={choiceTitles[name]} value={value} onChange={(next) => { if (values.includes(next)) onChange(next); }} options={choiceOptions(name)} />;
}
