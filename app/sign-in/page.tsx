import type { Metadata } from "next";
import { redirect } from "next/navigation";
import { readerOfPage } from "@/app/_server/projectPage";
import { signInNotice } from "@/app/_server/signInNotice";
import { ownAddress } from "@/components/addresses";
import { Header } from "@/components/frame/Header";
import { Page } from "@/components/frame/Page";
import { SignInPage as SignIn } from "@/components/signIn/SignInPage";

export const dynamic = "force-dynamic";
export const metadata: Metadata = { title: "Sign in" };

interface Props {
  searchParams: Promise<{ next?: string | string[] }>;
}

export default async function SignInPage({ searchParams }: Props) {
  const { next } = await searchParams;
  const address = ownAddress(typeof next === "string" ? next : undefined);
  // Who cannot be looked up just now may still try to sign in.
  if (await readerOfPage().catch(() => undefined)) redirect(address);
  return (
    <>
      <Header skipTo="#sign-in" skipWords="Skip to the form" />
      <Page>
        <SignIn next={address} notice={signInNotice()} />
      </Page>
    </>
  );
}
