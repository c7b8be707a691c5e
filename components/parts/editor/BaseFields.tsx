"use client";
import { Plus, Trash2 } from "lucide-react";
import { Button } from "@/components/ui/Button";
import { Choice } from "@/components/ui/Choice";
import { IconButton } from "@/components/ui/IconButton";
import { Notice } from "@/components/ui/Notice";
import { rowKey } from "../draft/newRows";
import type { BaseDraft, VertexDraft } from "../draft/partDraft";
import { useEditor } from "./editorContext";
import { HoleRows } from "./HoleRows";
import { PathField } from "./PathField";
import { RowProblems } from "./RowProblems";

/** Outline of the base, as a rectangle or by its corners, and its holes. */
export function BaseFields() {
  const { draft, update, problemAt } = useEditor();
  const { base } = draft;
  const set = (change: Partial<BaseDraft>) => update((old) => ({ ...old, base: { ...old.base, ...change } }));
  const toVertices = () => set({ kind: "vertices", vertices: [["0", "0"], [base.width, "0"], [base.width, base.depth], ["0", base.depth]].map(([x = "", y = ""]) => ({ key: rowKey(), x, y, bulge: "" })) });
  const outline = problemAt("base.outline");
  return (
    <div className="space-y-3">
      <Choice label="Outline" value={base.kind} onChange={(kind) => { if (kind === "vertices" && base.kind === "rectangle") toVertices(); else set({ kind }); }}
        options={[{ value: "rectangle", label: "Rectangle" }, { value: "vertices", label: "Corners" }]} />
      {base.kind === "rectangle" ? (
        <div className="grid max-w-md grid-cols-2 gap-4">
          <PathField path="base.width" label="Width (x)" value={base.width} onChange={(width) => set({ width })} />
          <PathField path="base.depth" label="Depth (y)" value={base.depth} onChange={(depth) => set({ depth })} />
        </div>
      ) : <VertexRows vertices={base.vertices} onChange={(vertices) => set({ vertices })} />}
      {outline === undefined ? null : <Notice tone="wrong" title={outline} />}
      <HoleRows at="base" holes={base.holes} onChange={(holes) => set({ holes })} />
    </div>
  );
}

function VertexRows({ vertices, onChange }: { readonly vertices: readonly VertexDraft[]; readonly onChange: (vertices: readonly VertexDraft[]) => void }) {
  const edit = (key: string, change: Partial<VertexDraft>) => onChange(vertices.map((vertex) => (vertex.key === key ? { ...vertex, ...change } : vertex)));
  return (
    <div>
      <p className="mb-1 text-sm text-ink-faint">Counter-clockwise, seen from the top. A bulge makes the edge that starts there an arc (tangent of a quarter of its angle).</p>
      <ol className="border-t border-rule">
        {vertices.map((vertex, i) => {
          return (
            <li key={vertex.key} className="border-b border-rule py-1.5">
              <div className="grid grid-cols-[2rem_repeat(3,minmax(4.5rem,8rem))_auto] items-start gap-3">
                <span className="num pt-2 text-ink-faint" aria-hidden>{i}</span>
                <PathField path={`base.outline[${i}][0]`} label={`Corner ${i} x`} labelHidden value={vertex.x} onChange={(x) => edit(vertex.key, { x })} placeholder="x" />
                <PathField path={`base.outline[${i}][1]`} label={`Corner ${i} y`} labelHidden value={vertex.y} onChange={(y) => edit(vertex.key, { y })} placeholder="y" />
                <PathField path={`base.outline[${i}][2]`} label={`Corner ${i} bulge`} labelHidden kind="number" value={vertex.bulge} onChange={(bulge) => edit(vertex.key, { bulge })} placeholder="bulge" />
                <IconButton label={`Remove corner ${i}`} danger disabled={vertices.length <= 3} onClick={() => onChange(vertices.filter((one) => one.key !== vertex.key))}><Trash2 aria-hidden /></IconButton>
              </div>
              <RowProblems paths={[`base.outline[${i}]`, `base.outline[${i}][0]`, `base.outline[${i}][1]`, `base.outline[${i}][2]`]} />
            </li>
          );
        })}
      </ol>
      <Button look="plain" size="small" className="mt-2" icon={<Plus aria-hidden />} onClick={() => onChange([...vertices, { key: rowKey(), x: "", y: "", bulge: "" }])}>Add a corner</Button>
    </div>
  );
}
