import type { InputHTMLAttributes, Ref } from "react";
import { controlClasses } from "./controlClasses";
import { describedBy, Field, type FieldFrame } from "./Field";

type TextInputProps = FieldFrame & Omit<InputHTMLAttributes<HTMLInputElement>, "id"> & { readonly ref?: Ref<HTMLInputElement> };

export function TextInput({ id, label, hint, error, labelHidden, errorHidden, className, ...rest }: TextInputProps) {
  const frame = { id, label, hint, error, className, ...(labelHidden === undefined ? {} : { labelHidden }), ...(errorHidden === undefined ? {} : { errorHidden }) };
  return (
    <Field {...frame}>
      <input {...rest} {...describedBy(frame)} id={id} className={controlClasses(error !== undefined)} />
    </Field>
  );
}
