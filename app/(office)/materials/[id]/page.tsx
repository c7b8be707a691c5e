import { MaterialPage } from "@/components/materials/view/MaterialPage";
import { can } from "@/lib/auth/permissions";
import { requirePage } from "@/lib/auth/requirePage";

interface MaterialRouteProps { readonly params: Promise<{ readonly id: string }> }

const idOf = async (params: MaterialRouteProps["params"]): Promise<string> => decodeURIComponent((await params).id);

export const generateMetadata = async ({ params }: MaterialRouteProps) => ({ title: await idOf(params) });

export default async function MaterialRoute({ params }: MaterialRouteProps) {
  const { role } = await requirePage("/materials/[id]");
  return <MaterialPage id={await idOf(params)} mayWrite={can(role, "materials:write")} />;
}
