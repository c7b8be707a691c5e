import { expect, it } from "vitest";
import { signInMessage } from "./signInErrors";

it("says in minutes when to try again, never less than one", () => {
  expect(signInMessage("too-many-attempts:1")).toMatch(/in 1 minute\.$/);
  expect(signInMessage("too-many-attempts:61")).toMatch(/in 2 minutes\.$/);
  expect(signInMessage("too-many-attempts:x")).toMatch(/in 15 minutes\.$/);
});

it("has words for every code, and says nothing when there is none", () => {
  expect(signInMessage("CredentialsSignin")).toMatch(/password is not right/);
  expect(signInMessage("toString")).toBe("Signing in failed. Try again.");
  expect(signInMessage("anything else")).toBe("Signing in failed. Try again.");
  expect(signInMessage(null)).toBeNull();
});
