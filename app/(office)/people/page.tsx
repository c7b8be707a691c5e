import { Suspense } from "react";
import { PersonList } from "@/components/account/people/PersonList";
import { requirePage } from "@/lib/auth/requirePage";

export const metadata = { title: "People" };

export default async function PeoplePage() {
  await requirePage("/people");
  return <Suspense><PersonList /></Suspense>;
}
