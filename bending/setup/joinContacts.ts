import type { Interval } from "../geometry/interval";
import type { Contact } from "./edgeContacts";

/** Contacts that fingers may share: the longest of them, and all their extents. */
export type JoinedContact = Contact & { readonly spans: readonly Interval[] };

/** mm. Depths and heights that differ by less are one setting. */
const SAME_SETTING_MM = 0.01;

/** Contacts at one depth and height are one choice: fingers may stand at different edges then. A slanted edge stands for itself. */
export function joinContacts(contacts: readonly Contact[]): readonly JoinedContact[] {
  const joined: (Contact & { spans: Interval[] })[] = [];
  for (const contact of contacts) {
    const at = contact.slope === 0 ? joined.findIndex((one) => sameSetting(one, contact)) : -1;
    const known = joined[at];
    if (known === undefined) {
      joined.push({ ...contact, spans: [contact.z] });
      continue;
    }
    const longer = contact.z[1] - contact.z[0] > known.z[1] - known.z[0] + 1e-6 ? contact : known;
    joined[at] = { ...longer, spans: [...known.spans, contact.z] };
  }
  return joined;
}

const setting = (value: number) => Math.round(value / SAME_SETTING_MM);

function sameSetting(one: Contact, other: Contact): boolean {
  return one.slope === 0 && one.on === other.on && setting(one.x) === setting(other.x) && setting(one.r) === setting(other.r);
}
