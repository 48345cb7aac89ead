import type { Metadata } from "next";
import { redirect } from "next/navigation";
import { readerOfPage } from "@/app/_server/projectPage";
import { signInNotice } from "@/app/_server/signInNotice";
import { exampleBuild } from "@/app/exampleBuild";
import { projectsAddress, signInAddress } from "@/components/addresses";
import { EntryPage } from "@/components/signIn/EntryPage";
import { readHat } from "@/components/signIn/HatChoice";
import { SignUpForm } from "@/components/signIn/SignUpForm";
import { WayOn } from "@/components/signIn/WayOn";

export const dynamic = "force-dynamic";
export const metadata: Metadata = { title: "Sign up" };

export default async function SignUpPage({ searchParams }: { searchParams: Promise<{ hat?: string | string[] }> }) {
  if (await readerOfPage().catch(() => undefined)) redirect(projectsAddress);
  const { hat } = await searchParams;
  return (
    <EntryPage
      heading="Sign up"
      example={exampleBuild()}
      links={
        <WayOn href={signInAddress()} before="Here before?">
          Sign in
        </WayOn>
      }
    >
      <SignUpForm hat={readHat(typeof hat === "string" ? hat : undefined)} notice={signInNotice()} />
    </EntryPage>
  );
}
