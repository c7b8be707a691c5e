import { InstrumentList } from "@/components/bendTable/instruments/InstrumentList";
import { can } from "@/lib/auth/permissions";
import { requirePage } from "@/lib/auth/requirePage";

export const metadata = { title: "Instruments" };

export default async function InstrumentsPage() {
  const { role } = await requirePage("/bend-table/instruments");
  return <InstrumentList mayWrite={can(role, "bendTable:write")} />;
}
