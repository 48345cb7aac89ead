"use client";

import { useRef, useState, type FormEvent } from "react";
import { emailRoute } from "../addresses";
import { ask, type Answered } from "../signIn/ask";
import { EmailField } from "../signIn/EmailField";
import { emailFault } from "../signIn/fieldChecks";
import { useWait } from "../signIn/useWait";
import { waitReason, WaitRule } from "../signIn/WaitRule";
import { Button } from "../ui/Button";
import { Disclosure } from "../ui/Disclosure";
import { Strip } from "../ui/Strip";
import { useProof } from "./useProof";

/** Moves the account to another e-mail: nothing changes until the link in the mail there is opened. */
export function EmailChange() {
  const [email, setEmail] = useState("");
  const [fault, setFault] = useState<string>();
  const [answered, setAnswered] = useState<Answered>();
  const [busy, setBusy] = useState(false);
  const [wait, beginWait, forgetWait] = useWait();
  const [prove, dialog] = useProof();
  const field = useRef<HTMLInputElement>(null);

  function refuse(words: string) {
    setFault(words);
    field.current?.focus();
  }

  async function submit(event: FormEvent) {
    event.preventDefault();
    if (busy || wait.left > 0) return;
    const found = emailFault(email);
    setFault(undefined);
    setAnswered(undefined);
    forgetWait();
    if (found) return refuse(found);
    setBusy(true);
    const answer = await prove("move your account to another e-mail", () => ask("POST", emailRoute, { email: email.trim() }));
    setBusy(false);
    setAnswered(answer);
    if (answer?.kind === "wait") beginWait(answer.seconds, answer.message);
    if (answer?.kind === "invalid") refuse(answer.fields.email ?? answer.message);
  }

  return (
    <>
      <Disclosure summary="Use another e-mail" className="mt-3">
        <form method="post" action={emailRoute} noValidate onSubmit={submit} className="flex flex-col gap-4">
          <EmailField ref={field} autoComplete="email" value={email} onType={setEmail} error={fault} />
          <WaitRule wait={wait} />
          {answered?.kind === "done" && (
            <Strip kind="mail" heading="A mail is on its way to the new e-mail">
              Its link works for an hour. The e-mail you have now gets a mail too, with a link that undoes the move for 7 days.
            </Strip>
          )}
          {(answered?.kind === "fault" || answered?.kind === "refused") && (
            <Strip kind="error" heading="Nothing was sent">{answered.message || "Try again in a few seconds."}</Strip>
          )}
          <div>
            <Button type="submit" aria-disabled={busy || undefined} reason={waitReason(wait)}>
              {busy ? "Sending" : "Send a link there"}
            </Button>
          </div>
        </form>
      </Disclosure>
      {dialog}
    </>
  );
}
