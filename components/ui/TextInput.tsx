import type { InputHTMLAttributes, Ref } from "react";
import { controlClasses } from "./controlClasses";
import { describedBy, Field, type FieldFrame } from "./Field";

type TextInputProps = FieldFrame & Omit<InputHTMLAttributes<HTMLInputElement>, "id"> & { readonly ref?: Ref<HTMLInputElement> };

export function TextInput({ id, label, hint, error, labelHidden, className, ...rest }: TextInputProps) {
  const frame = { id, label, hint, error, className, ...(labelHidden === undefined ? {} : { labelHidden }) };
  return (
    <Field {...frame}>
      <input {...rest} {...describedBy(frame)} id={id} className={controlClasses(error !== undefined)} />
    </Field>
  );
}
