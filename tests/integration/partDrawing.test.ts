import { WebIO } from "@gltf-transform/core";
import { expect, it } from "vitest";
import { GET as drawing } from "@/app/api/parts/[id]/drawing/route";
import { POST as createPart } from "@/app/api/parts/route";
import { flatPattern } from "@/bending";
import { importDxf } from "@/bending/exchange/dxf/import/importDxf";
import { sessionCookie, siteRequest } from "./accessPeople";
import { bracketCaller } from "./shop/bracketCaller";
import { bracketDocument } from "./shop/bracketDocument";
import { mustBuild } from "../laws/mustBuild";

const { call, person } = bracketCaller();

async function fetchDrawing(id: string, query: string): Promise<Response> {
  const request = siteRequest(`/api/parts/${id}/drawing?${query}`, { method: "GET", cookie: await sessionCookie(person("engineer").id) });
  return drawing(request, { params: Promise.resolve({ id }) });
}

it("gives a part as DXF, SVG and GLB that others can read, named after its revision", async () => {
  const { id, number } = (await call("engineer", createPart, "/api/parts", { body: { document: bracketDocument, note: "" } })).body as { id: string; number: string } & Record<string, unknown>;
  const dxf = await fetchDrawing(id, "format=dxf&ticks=yes&number=yes");
  expect([dxf.status, dxf.headers.get("content-disposition")]).toEqual([200, `attachment; filename="${number}-rev1.dxf"`]);
  const text = await dxf.text();
  expect(text).toContain(`${number} rev 1`);
  const read = importDxf(text, { name: "back", material: "S235", thickness: 2 });
  expect(read.ok && read.value.found.outline?.area).toBeCloseTo(flatPattern(mustBuild(bracketDocument)).area, 3);
  expect(read.ok && read.value.found.bends).toHaveLength(1);
  expect(await (await fetchDrawing(id, "format=svg")).text()).toContain("<title>Bracket</title>");
  const glb = new Uint8Array(await (await fetchDrawing(id, "format=glb&revision=1")).arrayBuffer());
  expect((await new WebIO().readBinary(glb)).getRoot().listMeshes().map((mesh) => mesh.getName())).toEqual(["base", "b1", "b1, bend"]);

  expect((await fetchDrawing(id, "format=pdf")).status).toBe(400);
  expect((await fetchDrawing(id, "format=dxf&revision=9")).status).toBe(404);
  expect((await fetchDrawing("00000000-0000-4000-8000-000000000000", "format=dxf")).status).toBe(404);
});
