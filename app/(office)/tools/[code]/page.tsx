import { ToolPage } from "@/components/tooling/tool/ToolPage";
import { can } from "@/lib/auth/permissions";
import { requirePage } from "@/lib/auth/requirePage";

interface ToolRouteProps { readonly params: Promise<{ readonly code: string }> }

const codeOf = async (params: ToolRouteProps["params"]): Promise<string> => decodeURIComponent((await params).code);

export const generateMetadata = async ({ params }: ToolRouteProps) => ({ title: await codeOf(params) });

export default async function ToolRoute({ params }: ToolRouteProps) {
  const { role } = await requirePage("/tools/[code]");
  return <ToolPage code={await codeOf(params)} mayWrite={can(role, "tools:write")} />;
}
