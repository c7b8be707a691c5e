"use client";
import { usePathname, useRouter, useSearchParams } from "next/navigation";
import { useCallback } from "react";
import type { ListState } from "./DataTable";

type Change = Partial<ListState> & Readonly<Record<string, string | number | undefined>>;

/** What a list shows, kept in the address so that back, reload and a copied link bring it again. */
export function useListState(start: { readonly sort: string; readonly dir?: "asc" | "desc"; readonly pageSize?: number }) {
  const router = useRouter();
  const path = usePathname();
  const params = useSearchParams();
  const page = Number(params.get("page") ?? "1");
  const state: ListState = {
    q: params.get("q") ?? "",
    sort: params.get("sort") ?? start.sort,
    dir: params.get("dir") === "desc" ? "desc" : params.get("dir") === "asc" ? "asc" : (start.dir ?? "asc"),
    page: Number.isInteger(page) && page > 0 ? page : 1,
    pageSize: start.pageSize ?? 25,
  };
  const change = useCallback((next: Change) => {
    const to = new URLSearchParams(params.toString());
    if (next.page === undefined) to.delete("page");
    for (const [key, value] of Object.entries(next)) {
      if (value === undefined || value === "" || (key === "page" && value === 1)) to.delete(key);
      else to.set(key, String(value));
    }
    const text = to.toString();
    router.replace(text === "" ? path : `${path}?${text}`, { scroll: false });
  }, [params, path, router]);
  return { state, change, param: (name: string) => params.get(name) ?? "" };
}
