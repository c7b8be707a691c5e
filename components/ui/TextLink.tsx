import Link from "next/link";
import type { ComponentProps } from "react";

export const TextLink = (props: ComponentProps<typeof Link>) =>
  <Link {...props} className="font-medium text-accent-ink underline decoration-accent/40 underline-offset-2 hover:decoration-accent" />;
