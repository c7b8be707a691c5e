import { redirect } from "next/navigation";
import { SignInForm } from "@/components/account/SignInForm";
import { Mark } from "@/components/ui/Mark";
import { FoldPlate } from "@/components/account/FoldPlate";
import { currentPerson } from "@/lib/auth/currentPerson";
import { safeNext } from "@/lib/auth/safeNext";
import { signInMessage } from "@/lib/auth/signInErrors";

export const metadata = { title: "Sign in" };

interface SignInPageProps { readonly searchParams: Promise<Readonly<Record<string, string | readonly string[] | undefined>>> }

export default async function SignInPage({ searchParams }: SignInPageProps) {
  const asked = await searchParams;
  const text = (name: string) => { const value = asked[name]; return typeof value === "string" ? value : null; };
  const next = safeNext(text("next"));
  const person = await currentPerson().catch(() => null);
  if (person !== null) redirect(next);
  return (
    <main id="content" className="grid min-h-dvh lg:grid-cols-[minmax(0,1fr)_30rem]">
      <FoldPlate />
      <div className="flex flex-col justify-center border-ink px-8 py-12 lg:border-l">
        <div className="mx-auto w-full max-w-sm">
          <p className="mb-8 flex items-center gap-3 text-xl font-semibold tracking-tight"><Mark className="size-8" />Foldwright</p>
          <h1 className="mb-4 border-t-2 border-ink pt-3 text-2xl font-semibold tracking-tight">Sign in</h1>
          <SignInForm next={next} firstMessage={signInMessage(text("error"))} />
          <p className="mt-6 text-sm text-ink-faint">No account, or a lost password? Whoever manages the shop can help.</p>
        </div>
      </div>
    </main>
  );
}
