import { CalculatorLoader } from "@/components/calculator/CalculatorLoader";
import { can } from "@/lib/auth/permissions";
import { requirePage } from "@/lib/auth/requirePage";

export const metadata = { title: "Calculator" };

export default async function CalculatorPage() {
  const { role } = await requirePage("/calculator");
  return <CalculatorLoader reads={{ materials: can(role, "materials:read"), machines: can(role, "machines:read"), tools: can(role, "tools:read"), shopTable: can(role, "parts:read") }} />;
}
