import { Suspense } from "react";
import { MachineList } from "@/components/tooling/machines/MachineList";
import { requirePage } from "@/lib/auth/requirePage";

export const metadata = { title: "Brakes" };

export default async function MachinesPage() {
  await requirePage("/machines");
  return <Suspense><MachineList /></Suspense>;
}
