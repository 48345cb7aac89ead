import type { Metadata } from "next";
import { clockChoices, currencyChoices } from "@/app/_server/clocks";
import { requirePageReader } from "@/app/_server/projectPage";
import { teamsOfPage } from "@/app/_server/teams";
import { newProjectAddress, projectsAddress, signInAddress } from "@/components/addresses";
import { Header } from "@/components/frame/Header";
import { Page } from "@/components/frame/Page";
import { EmptyYards } from "@/components/projects/EmptyYards";
import { NewYardForm } from "@/components/projects/NewYardForm";
import { LinkButton } from "@/components/ui/Button";
import { FiguresProvider } from "@/components/ui/figures";

export const dynamic = "force-dynamic";
export const metadata: Metadata = { title: "New yard" };

type Asked = Record<string, string | string[] | undefined>;

export default async function NewProjectPage({ searchParams }: { searchParams: Promise<Asked> }) {
  const reader = await requirePageReader(signInAddress(newProjectAddress));
  const teams = await teamsOfPage(reader);
  const start = (await searchParams).start === "example" ? "example" : "empty";
  return (
    <>
      <Header
        theme={reader.theme === "system" ? undefined : reader.theme}
        user={{ name: reader.name, email: reader.email }}
        home={projectsAddress}
        skipTo="#new-yard"
        skipWords="Skip to the new yard"
      />
      <Page>
        <h1 id="new-yard" tabIndex={-1} className="mb-4 mt-2 text-verdictPhone mid:mb-5 mid:text-head">
          New yard
        </h1>
        <FiguresProvider value={reader.figures}>
          {teams.length > 0 ? (
            <NewYardForm teams={teams} clocks={clockChoices()} currencies={currencyChoices()} start={start} />
          ) : (
            <EmptyYards mayMake={false} actions={<LinkButton href={projectsAddress}>Back to your yards</LinkButton>} />
          )}
        </FiguresProvider>
      </Page>
    </>
  );
}
