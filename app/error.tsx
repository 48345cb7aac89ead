"use client";

import { Header } from "@/components/frame/Header";
import { Page } from "@/components/frame/Page";
import { Button } from "@/components/ui/Button";

interface Props {
  error: Error & { digest?: string };
  reset: () => void;
}

export default function ErrorPage({ error, reset }: Props) {
  return (
    <>
      <Header skipTo="#trouble" skipWords="Skip to the message" />
      <Page>
        <section role="alert" className="max-w-prose rounded-sheet border-2 border-over bg-sheet p-4 mid:p-6.5" aria-labelledby="trouble">
          <h1 id="trouble" tabIndex={-1} className="text-head">
            This page could not be made.
          </h1>
          <p className="mb-5 mt-2 text-ink2">
            Something went wrong on our side. What was saved is safe.
            {error.digest && ` If it stays like this, tell us the number ${error.digest}.`}
          </p>
          <Button look="ink" onClick={reset}>
            Try again
          </Button>
        </section>
      </Page>
    </>
  );
}
