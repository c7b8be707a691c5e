"use client";
import { Button } from "./Button";
import { Notice } from "./Notice";

interface LoadProblemProps {
  /** With a capital: "The part". */
  readonly what: string;
  readonly error: Error;
  readonly onRetry: () => void;
}

export function LoadProblem({ what, error, onRetry }: LoadProblemProps) {
  return (
    <Notice tone="wrong" title={`${what} could not be shown`} live>
      <p>{error.message}</p>
      <Button look="plain" size="small" onClick={onRetry}>Try again</Button>
    </Notice>
  );
}
