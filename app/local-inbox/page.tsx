import type { Metadata } from "next";
import { cookies } from "next/headers";
import { notFound } from "next/navigation";
import { readLocalInbox, type LocalMail } from "@/app/_server/localInbox";
import { Header } from "@/components/frame/Header";
import { Page } from "@/components/frame/Page";
import { readTheme, THEME_COOKIE } from "@/components/frame/theme";

export const dynamic = "force-dynamic";
export const metadata: Metadata = { title: "Mail kept here" };

/** What a run on this very machine would have sent. There is no such page where mail is really sent. */
export default async function LocalInboxPage() {
  const mails = readLocalInbox();
  if (!mails) notFound();
  return (
    <>
      <Header theme={readTheme((await cookies()).get(THEME_COOKIE)?.value)} skipTo="#mails" skipWords="Skip to the mails" />
      <Page>
        <h1 id="mails" tabIndex={-1} className="text-head">
          Mail kept here
        </h1>
        <p className="mb-4 mt-2 max-w-prose text-ink2">
          This run sends no mail: it keeps the last hundred here until it ends, for whoever sits at this machine.
        </p>
        {mails.length === 0 && <p className="rounded-sheet bg-sheet p-4 mid:p-6.5">Nothing came yet. Sign up, then load this page again.</p>}
        <ol className="flex flex-col gap-3">
          {mails.map((mail) => (
            <li key={mail.id}>
              <Mail mail={mail} />
            </li>
          ))}
        </ol>
      </Page>
    </>
  );
}

function Mail({ mail: { to, subject, text, at } }: { mail: LocalMail }) {
  return (
    <article className="max-w-[860px] rounded-sheet bg-sheet p-4 mid:p-6.5">
      <h2 className="text-section">{subject}</h2>
      <p className="mb-3 mt-0.5 break-words text-second text-ink3">
        To {to}, <time dateTime={at.toISOString()}>{at.toISOString().slice(11, 19)} UTC</time>
      </p>
      <p className="whitespace-pre-line break-words">
        {text.split(/(https?:\/\/\S+)/).map((piece, place) =>
          place % 2 === 1 ? (
            <a key={place} href={piece} className="break-all underline">
              {piece}
            </a>
          ) : (
            piece
          ),
        )}
      </p>
    </article>
  );
}
