import { expect, it } from "vitest";
import { roles } from "@/lib/schemas/role";
import { apiAccess, pageAccess } from "./accessTable";
import { homePath } from "./homePath";
import { mayEnter } from "./mayEnter";

it("lets the signed out into what is public alone", () => {
  for (const access of [...Object.values(apiAccess), ...Object.values(pageAccess)]) {
    expect(mayEnter(null, access)).toBe(access === "public");
  }
});

it("lets every role into where its work begins", () => {
  for (const role of roles) expect(mayEnter(role, pageAccess[homePath(role)])).toBe(true);
});

it("keeps writing to those whose work it is", () => {
  const writers = (key: keyof typeof apiAccess) => roles.filter((role) => mayEnter(role, apiAccess[key]));
  expect(writers("POST /api/parts")).toEqual(["engineer"]);
  expect(writers("POST /api/plans")).toEqual(["engineer"]);
  expect(writers("POST /api/sheets/[id]/release")).toEqual(["engineer"]);
  expect(writers("PATCH /api/tools/[code]")).toEqual(["toolroom"]);
  expect(writers("GET /api/activity")).toEqual(["manager"]);
});
