import type { Metadata } from "next";
import { exampleBuild } from "@/app/exampleBuild";
import { CheckMail } from "@/components/signIn/CheckMail";
import { EntryPage } from "@/components/signIn/EntryPage";

export const dynamic = "force-dynamic";
export const metadata: Metadata = { title: "Look in your mail" };

export default function CheckMailPage() {
  return (
    <EntryPage heading="Look in your mail" example={exampleBuild()}>
      <CheckMail />
    </EntryPage>
  );
}
