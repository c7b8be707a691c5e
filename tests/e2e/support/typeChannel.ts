import type { Page } from "@playwright/test";

/** The U with returns of the journey: leg after leg, all bends 90 degrees up. */
export const channelLegs = [15, 40, 90, 40, 15] as const;

/** Types the channel into the editor of a new part, from the U that it begins with. */
export async function typeChannel(page: Page, name: string): Promise<void> {
  const leg = (number: number) => page.getByLabel(`Leg ${number} length`);
  await page.getByLabel("Name", { exact: true }).fill(name);
  await page.getByLabel("Width (along the bends)").fill("240");
  for (const [index, length] of channelLegs.entries()) {
    if (index > 2) await leg(index).press("Enter");
    await leg(index + 1).fill(String(length));
  }
}
