import { ChevronLeft, ChevronRight } from "lucide-react";
import { Button } from "./Button";

interface PagerProps {
  readonly list: { readonly page: number; readonly pageSize: number };
  readonly total: number;
  readonly onPage: (page: number) => void;
}

export function Pager({ list, total, onPage }: PagerProps) {
  const pages = Math.max(1, Math.ceil(total / list.pageSize));
  const from = total === 0 ? 0 : (list.page - 1) * list.pageSize + 1;
  const to = Math.min(total, list.page * list.pageSize);
  return (
    <nav aria-label="Pages" className="mt-2 flex flex-wrap items-center justify-between gap-3 text-sm text-ink-soft">
      <p aria-live="polite"><span className="num">{from}</span> to <span className="num">{to}</span> of <span className="num">{total}</span></p>
      {pages === 1 ? null : (
        <div className="flex items-center gap-2">
          <Button look="plain" size="small" disabled={list.page <= 1} icon={<ChevronLeft aria-hidden />} onClick={() => onPage(list.page - 1)}>Previous</Button>
          <span>Page <span className="num">{list.page}</span> of <span className="num">{pages}</span></span>
          <Button look="plain" size="small" disabled={list.page >= pages} onClick={() => onPage(list.page + 1)}>Next<ChevronRight aria-hidden /></Button>
        </div>
      )}
    </nav>
  );
}
