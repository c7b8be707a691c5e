import { ForceFactors } from "@/components/settings/ForceFactors";
import { PageHeader } from "@/components/ui/PageHeader";
import { can } from "@/lib/auth/permissions";
import { requirePage } from "@/lib/auth/requirePage";

export const metadata = { title: "Settings" };

export default async function SettingsPage() {
  const { role } = await requirePage("/settings");
  return (
    <>
      <PageHeader kicker="Shop" title="Settings" summary="Where published sources disagree, the shop’s own experience decides." />
      <ForceFactors mayWrite={can(role, "settings:write")} />
    </>
  );
}
