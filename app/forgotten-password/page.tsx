import type { Metadata } from "next";
import { exampleBuild } from "@/app/exampleBuild";
import { signInAddress } from "@/components/addresses";
import { EntryPage } from "@/components/signIn/EntryPage";
import { ForgottenForm } from "@/components/signIn/ForgottenForm";
import { WayOn } from "@/components/signIn/WayOn";

export const dynamic = "force-dynamic";
export const metadata: Metadata = { title: "Forgotten password" };

export default function ForgottenPasswordPage() {
  return (
    <EntryPage heading="Forgotten the password?" example={exampleBuild()} links={<WayOn href={signInAddress()}>Back to the sign-in</WayOn>}>
      <ForgottenForm />
    </EntryPage>
  );
}
