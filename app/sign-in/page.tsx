import type { Metadata } from "next";
import { redirect } from "next/navigation";
import { readerOfPage } from "@/app/_server/projectPage";
import { signInNotice } from "@/app/_server/signInNotice";
import { exampleBuild } from "@/app/exampleBuild";
import { forgottenAddress, ownAddress, signUpAddress } from "@/components/addresses";
import { EntryPage } from "@/components/signIn/EntryPage";
import { SignInForm } from "@/components/signIn/SignInForm";
import { WayOn } from "@/components/signIn/WayOn";

export const dynamic = "force-dynamic";
export const metadata: Metadata = { title: "Sign in" };

interface Props {
  searchParams: Promise<{ next?: string | string[] }>;
}

const links = (
  <>
    <WayOn href={forgottenAddress}>Forgotten the password?</WayOn>
    <WayOn href={signUpAddress} before="New here?">
      Sign up
    </WayOn>
  </>
);

export default async function SignInPage({ searchParams }: Props) {
  const { next } = await searchParams;
  const address = ownAddress(typeof next === "string" ? next : undefined);
  // Who cannot be looked up just now may still try to sign in.
  if (await readerOfPage().catch(() => undefined)) redirect(address);
  return (
    <EntryPage heading="Sign in" example={exampleBuild()} links={links}>
      <SignInForm next={address} notice={signInNotice()} />
    </EntryPage>
  );
}
