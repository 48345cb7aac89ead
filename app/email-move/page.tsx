import type { Metadata } from "next";
import { exampleBuild } from "@/app/exampleBuild";
import { EmailMove } from "@/components/signIn/EmailMove";
import { EntryPage } from "@/components/signIn/EntryPage";

export const dynamic = "force-dynamic";
export const metadata: Metadata = { title: "Move to this e-mail" };

export default async function EmailMovePage({ searchParams }: { searchParams: Promise<{ token?: string | string[] }> }) {
  const { token } = await searchParams;
  return (
    <EntryPage heading="Move to this e-mail?" example={exampleBuild()}>
      <EmailMove way="move" token={typeof token === "string" ? token : ""} />
    </EntryPage>
  );
}
