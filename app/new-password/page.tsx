import type { Metadata } from "next";
import { signInNotice } from "@/app/_server/signInNotice";
import { exampleBuild } from "@/app/exampleBuild";
import { EntryPage } from "@/components/signIn/EntryPage";
import { NewPasswordForm } from "@/components/signIn/NewPasswordForm";
import { Strip } from "@/components/ui/Strip";

export const dynamic = "force-dynamic";
export const metadata: Metadata = { title: "New password" };

export default async function NewPasswordPage({ searchParams }: { searchParams: Promise<{ token?: string | string[] }> }) {
  const { token } = await searchParams;
  const notice = signInNotice();
  return (
    <EntryPage heading="New password" example={exampleBuild()}>
      {notice && <Strip kind="note" heading={notice} className="mb-4" />}
      <NewPasswordForm token={typeof token === "string" ? token : ""} />
    </EntryPage>
  );
}
