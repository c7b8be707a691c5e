"use client";
import { zodResolver } from "@hookform/resolvers/zod";
import { signIn } from "next-auth/react";
import { useRouter } from "next/navigation";
import { useState } from "react";
import { useForm } from "react-hook-form";
import { z } from "zod";
import { Button } from "@/components/ui/Button";
import { Notice } from "@/components/ui/Notice";
import { TextInput } from "@/components/ui/TextInput";
import { signInMessage } from "@/lib/auth/signInErrors";

const schema = z.object({
  email: z.string().trim().min(1, "Type your e-mail address.").pipe(z.email("Type a whole e-mail address, like name@shop.example.")),
  password: z.string().min(1, "Type your password."),
});
type SignInValues = z.infer<typeof schema>;

interface SignInFormProps {
  /** Where to go afterwards: a path of this site. */
  readonly next: string;
  readonly firstMessage: string | null;
}

export function SignInForm({ next, firstMessage }: SignInFormProps) {
  const router = useRouter();
  const [message, setMessage] = useState(firstMessage);
  const { register, handleSubmit, setFocus, resetField, formState: { errors, isSubmitting, isSubmitSuccessful } } = useForm<SignInValues>({
    resolver: zodResolver(schema), defaultValues: { email: "", password: "" },
  });
  const submit = handleSubmit(async (values) => {
    setMessage(null);
    const answer = await signIn("credentials", { ...values, redirect: false }).catch(() => undefined);
    if (answer?.ok === true) { router.replace(next); router.refresh(); return; }
    setMessage(answer === undefined ? "The server cannot be reached. Check the network and try again." : signInMessage(answer.error ?? "unknown"));
    resetField("password");
    setFocus("password");
    throw new Error("not signed in");
  });
  return (
    <form noValidate method="post" onSubmit={(event) => { submit(event).catch(() => undefined); }} className="space-y-4">
      {message === null ? null : <Notice tone="wrong" title={message} live />}
      <TextInput id="email" label="E-mail address" type="email" autoComplete="username" autoFocus error={errors.email?.message} {...register("email")} />
      <TextInput id="password" label="Password" type="password" autoComplete="current-password" error={errors.password?.message} {...register("password")} />
      <Button type="submit" busy={isSubmitting || isSubmitSuccessful} className="w-full">Sign in</Button>
    </form>
  );
}
