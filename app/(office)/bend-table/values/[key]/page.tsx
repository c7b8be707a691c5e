import { ValuePage } from "@/components/bendTable/values/ValuePage";
import { can } from "@/lib/auth/permissions";
import { requirePage } from "@/lib/auth/requirePage";

interface ValueRouteProps { readonly params: Promise<{ readonly key: string }> }

const keyOf = async (params: ValueRouteProps["params"]): Promise<string> => decodeURIComponent((await params).key);

export const generateMetadata = async ({ params }: ValueRouteProps) => ({ title: await keyOf(params) });

export default async function ValueRoute({ params }: ValueRouteProps) {
  const { role } = await requirePage("/bend-table/values/[key]");
  return <ValuePage valueKey={await keyOf(params)} mayJudge={can(role, "bendTable:judge")} />;
}
