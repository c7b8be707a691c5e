import { Suspense } from "react";
import { ActivityList } from "@/components/account/activity/ActivityList";
import { requirePage } from "@/lib/auth/requirePage";

export const metadata = { title: "Activity" };

export default async function ActivityPage() {
  await requirePage("/activity");
  return <Suspense><ActivityList /></Suspense>;
}
