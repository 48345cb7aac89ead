import type { Metadata } from "next";
import { cookies } from "next/headers";
import { redirect } from "next/navigation";
import { projectsAddress, signInAddress } from "@/components/addresses";
import { Header } from "@/components/frame/Header";
import { Page } from "@/components/frame/Page";
import { readTheme, THEME_COOKIE } from "@/components/frame/theme";
import { readHour } from "@/components/landing/hours";
import { BUILD_KEYS } from "@/components/landing/LandingBuild";
import { landingBuildOf, nightOf } from "@/components/landing/landingBuildOf";
import { LandingPage } from "@/components/landing/LandingPage";
import { LinkButton } from "@/components/ui/Button";
import { landingAnswers } from "./_server/landingAnswers";
import { readerOfPage } from "./_server/projectPage";

export const dynamic = "force-dynamic";
export const metadata: Metadata = { title: { absolute: "Stillyard: know what next door will hear" } };

interface Props {
  searchParams: Promise<{ build?: string | string[]; hour?: string | string[] }>;
}

const one = (value: string | string[] | undefined) => (typeof value === "string" ? value : undefined);

export default async function HomePage({ searchParams }: Props) {
  // Who cannot be looked up just now sees what visitors see.
  if (await readerOfPage().catch(() => undefined)) redirect(projectsAddress);
  const { build, hour } = await searchParams;
  const answers = landingAnswers();
  const [{ plan, verdict }] = answers;
  return (
    <>
      <Header
        theme={readTheme((await cookies()).get(THEME_COOKIE)?.value)}
        skipTo="#job"
        skipWords="Skip to what it does"
        action={<LinkButton href={signInAddress()} className="max-mid:hidden">Sign in</LinkButton>}
      />
      <Page>
        <LandingPage
          builds={answers.map((answer) => landingBuildOf(answer.key, answer.plan, answer.verdict))}
          night={nightOf(plan, verdict)}
          build={BUILD_KEYS.find((key) => key === one(build)) ?? "b"}
          minutes={readHour(one(hour))}
        />
      </Page>
    </>
  );
}
