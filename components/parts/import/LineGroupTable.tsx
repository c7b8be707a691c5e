"use client";
import type { LineGroup, LineRole } from "@/bending/exchange/dxf/import/lineGroup";
import { Select } from "@/components/ui/Select";
import { colourName } from "./colourName";

interface LineGroupTableProps {
  readonly groups: readonly LineGroup[];
  readonly roles: Readonly<Record<string, LineRole>>;
  readonly onRole: (key: string, role: LineRole) => void;
}

const options: readonly { readonly value: LineRole; readonly label: string }[] = [
  { value: "cut", label: "Cut" }, { value: "bend up", label: "Bend up" }, { value: "bend down", label: "Bend down" }, { value: "leave out", label: "Leave out" },
];

/** The drawing's lines by layer, colour and line type, and what each sort is for. */
export function LineGroupTable({ groups, roles, onRole }: LineGroupTableProps) {
  return (
    <div className="overflow-x-auto border-y border-ink">
      <table className="w-full border-collapse text-left">
        <caption className="sr-only">Lines of the drawing by layer, colour and line type</caption>
        <thead><tr className="border-b border-rule-strong text-sm text-ink-soft">{["Layer", "Colour", "Line type", "Lines", "Taken as"].map((head) => <th key={head} scope="col" className="px-2 py-1 font-medium">{head}</th>)}</tr></thead>
        <tbody>
          {groups.map((group, i) => (
            <tr key={group.key} className="border-b border-rule last:border-b-0">
              <th scope="row" className="max-w-40 px-2 py-1 font-medium break-words">{group.layer}{group.hidden ? <span className="block text-sm font-normal text-ink-faint">off or frozen</span> : null}</th>
              <td className="px-2 py-1 text-sm whitespace-nowrap">{colourName(group.colour)}</td>
              <td className="px-2 py-1 text-sm">{group.lineType.toLowerCase()}</td>
              <td className="px-2 py-1 text-sm">{Object.entries(group.kinds).map(([kind, count]) => `${count} ${kind.toLowerCase()}`).join(", ")}</td>
              <td className="min-w-34 px-1 py-1">
                <Select id={`role-${i}`} label={`Lines on ${group.layer}, ${colourName(group.colour)}, ${group.lineType.toLowerCase()} are taken as`} labelHidden value={roles[group.key] ?? "cut"} options={options}
                  onChange={(value) => { const found = options.find((one) => one.value === value); if (found) onRole(group.key, found.value); }} />
              </td>
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}
