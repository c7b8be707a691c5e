import type { Ref, TextareaHTMLAttributes } from "react";
import { controlClasses } from "./controlClasses";
import { describedBy, Field, type FieldFrame } from "./Field";

type TextAreaProps = FieldFrame & Omit<TextareaHTMLAttributes<HTMLTextAreaElement>, "id"> & { readonly numbers?: boolean; readonly ref?: Ref<HTMLTextAreaElement> };

export function TextArea({ id, label, hint, error, labelHidden, className, numbers = false, ...rest }: TextAreaProps) {
  const frame = { id, label, hint, error, className, ...(labelHidden === undefined ? {} : { labelHidden }) };
  return (
    <Field {...frame}>
      <textarea {...rest} {...describedBy(frame)} id={id} className={controlClasses(error !== undefined, numbers ? "num py-2" : "py-2")} />
    </Field>
  );
}
