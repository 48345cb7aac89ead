import type { Metadata } from "next";
import { projectsAddress } from "@/components/addresses";
import { Header } from "@/components/frame/Header";
import { Page } from "@/components/frame/Page";
import { LinkButton } from "@/components/ui/Button";

export const metadata: Metadata = { title: "Nothing here" };

export default function NotFoundPage() {
  return (
    <>
      <Header skipTo="#nothing" skipWords="Skip to the message" />
      <Page>
        <section className="max-w-prose rounded-sheet bg-sheet p-4 mid:p-6.5" aria-labelledby="nothing">
          <h1 id="nothing" tabIndex={-1} className="text-head">
            There is nothing here.
          </h1>
          <p className="mb-5 mt-2 text-ink2">
            The address may be mistyped, or what stood here is not open to you. Your own yards are one step away.
          </p>
          <LinkButton look="ink" href={projectsAddress}>
            Go to your yards
          </LinkButton>
        </section>
      </Page>
    </>
  );
}
