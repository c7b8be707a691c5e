"use client";
import { Plus, Trash2 } from "lucide-react";
import type { FieldProblem } from "@/bending/core/problem";
import { mpa } from "@/bending/core/units";
import { steelRadiusTable } from "@/bending/handbook/steelRadiusTable";
import { Button } from "@/components/ui/Button";
import { Choice } from "@/components/ui/Choice";
import { IconButton } from "@/components/ui/IconButton";
import { NumberInput } from "@/components/ui/NumberInput";
import { asSentence } from "@/lib/format/asSentence";
import { parseNumber } from "@/lib/format/parseNumber";
import type { MaterialDraft, RadiusRowDraft } from "./materialDraft";

interface RadiiEditorProps {
  readonly draft: MaterialDraft;
  readonly onChange: (change: Pick<MaterialDraft, "radiiAs" | "radii">) => void;
  readonly problems: readonly FieldProblem[];
}

const kinds = [{ value: "none", label: "Not known" }, { value: "mm", label: "In mm" }, { value: "thickness", label: "Times thickness" }] as const;
const columns = [["upTo", "Thickness up to"], ["across", "Across the grain"], ["along", "Along the grain"]] as const;

/** Smallest inside radii by thickness; across and along the rolling direction. */
export function RadiiEditor({ draft, onChange, problems }: RadiiEditorProps) {
  const { radii, radiiAs } = draft;
  const put = (change: Partial<Pick<MaterialDraft, "radiiAs" | "radii">>) => onChange({ radiiAs, radii, ...change });
  const edit = (row: number, change: Partial<RadiusRowDraft>) => put({ radii: radii.map((entry, index) => (index === row ? { ...entry, ...change } : entry)) });
  const at = (path: string) => { const found = problems.find((problem) => problem.path === path); return found === undefined ? undefined : asSentence(found.message); };
  const tensile = parseNumber(draft.tensileLow);
  const standard = draft.group === "steel" && tensile.ok ? steelRadiusTable(mpa(tensile.value)) : null;
  const fill = () => { if (standard !== null) onChange({ radiiAs: "mm", radii: standard.rows.map(({ upTo, across, along }) => ({ upTo: String(upTo), across: String(across), along: along === null ? "" : String(along) })) }); };
  return (
    <div className="space-y-3">
      <div className="flex flex-wrap items-end gap-3">
        <Choice label="Radii are given" labelHidden value={radiiAs} options={kinds} onChange={(next) => put({ radiiAs: next, radii: next !== "none" && radii.length === 0 ? [{ upTo: "", across: "", along: "" }] : radii })} />
        {standard === null ? null : <Button look="plain" onClick={fill}>Fill in DIN 6935 for {draft.tensileLow} MPa</Button>}
      </div>
      {radiiAs === "none" ? null : (
        <>
          <table className="w-full max-w-xl border-collapse">
            <thead>
              <tr className="text-left text-sm text-ink-soft">{columns.map(([key, words]) => <th key={key} scope="col" className="pr-2 pb-1 font-medium">{words}</th>)}<th scope="col"><span className="sr-only">Remove</span></th></tr>
            </thead>
            <tbody>
              {radii.map((entry, row) => (
                <tr key={row} className="align-top">
                  {columns.map(([key, words]) => (
                    <td key={key} className="pr-2 pb-1.5">
                      <NumberInput id={`material-minimumRadii.rows[${row}].${key}`} label={`${words}, row ${row + 1}`} labelHidden unit={key === "upTo" || radiiAs === "mm" ? "mm" : "t"} value={entry[key]}
                        placeholder={key === "along" ? "not known" : undefined} error={at(`minimumRadii.rows[${row}].${key}`)} onChange={(event) => edit(row, { [key]: event.target.value })} />
                    </td>
                  ))}
                  <td className="w-10"><IconButton label={`Remove row ${row + 1}`} danger onClick={() => put({ radii: radii.filter((_, index) => index !== row) })}><Trash2 aria-hidden /></IconButton></td>
                </tr>
              ))}
            </tbody>
          </table>
          <Button look="plain" size="small" icon={<Plus aria-hidden />} onClick={() => put({ radii: [...radii, { upTo: "", across: "", along: "" }] })}>Add a row</Button>
          {at("minimumRadii.rows") === undefined ? null : <p className="text-sm text-brick-ink">{at("minimumRadii.rows")}</p>}
        </>
      )}
    </div>
  );
}
