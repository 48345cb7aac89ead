import type { Metadata } from "next";
import { exampleBuild } from "@/app/exampleBuild";
import { EntryPage } from "@/components/signIn/EntryPage";
import { EmailCheck } from "@/components/signIn/EmailCheck";

export const dynamic = "force-dynamic";
export const metadata: Metadata = { title: "Check your e-mail" };

export default async function EmailCheckPage({ searchParams }: { searchParams: Promise<{ token?: string | string[] }> }) {
  const { token } = await searchParams;
  return (
    <EntryPage heading="Is this e-mail yours?" example={exampleBuild()}>
      <EmailCheck token={typeof token === "string" ? token : ""} />
    </EntryPage>
  );
}
