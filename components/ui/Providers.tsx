"use client";
import { QueryClient, QueryClientProvider } from "@tanstack/react-query";
import { Tooltip } from "radix-ui";
import { useState, type ReactNode } from "react";
import { shouldRetry } from "@/lib/queries/shouldRetry";
import { ToastProvider } from "./ToastProvider";

/** What every page needs around it: the query cache, toasts and tooltips. */
export function Providers({ children }: { readonly children: ReactNode }) {
  const [client] = useState(() => new QueryClient({
    defaultOptions: { queries: { staleTime: 10_000, retry: shouldRetry, refetchOnWindowFocus: false } },
  }));
  return (
    <QueryClientProvider client={client}>
      <Tooltip.Provider delayDuration={300}>
        <ToastProvider>{children}</ToastProvider>
      </Tooltip.Provider>
    </QueryClientProvider>
  );
}
