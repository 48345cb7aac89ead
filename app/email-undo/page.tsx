import type { Metadata } from "next";
import { exampleBuild } from "@/app/exampleBuild";
import { EmailMove } from "@/components/signIn/EmailMove";
import { EntryPage } from "@/components/signIn/EntryPage";

export const dynamic = "force-dynamic";
export const metadata: Metadata = { title: "Keep this e-mail" };

export default async function EmailUndoPage({ searchParams }: { searchParams: Promise<{ token?: string | string[] }> }) {
  const { token } = await searchParams;
  return (
    <EntryPage heading="Keep this e-mail?" example={exampleBuild()}>
      <EmailMove way="undo" token={typeof token === "string" ? token : ""} />
    </EntryPage>
  );
}
