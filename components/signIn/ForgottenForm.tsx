"use client";

import { useRef, useState, type FormEvent } from "react";
import { forgottenRoute } from "../addresses";
import { Button } from "../ui/Button";
import { Strip } from "../ui/Strip";
import { ask, type Answered } from "./ask";
import { EmailField } from "./EmailField";
import { emailFault } from "./fieldChecks";
import { useWait } from "./useWait";
import { waitReason, WaitRule } from "./WaitRule";

/** The answer is the same for every e-mail. */
export function ForgottenForm() {
  const [email, setEmail] = useState("");
  const [fault, setFault] = useState<string>();
  const [answered, setAnswered] = useState<Answered>();
  const [busy, setBusy] = useState(false);
  const [wait, beginWait, forgetWait] = useWait();
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
    const answer = await ask("POST", forgottenRoute, { email: email.trim() });
    setBusy(false);
    setAnswered(answer);
    if (answer.kind === "wait") beginWait(answer.seconds, answer.message);
    if (answer.kind === "invalid") refuse(answer.fields.email ?? answer.message);
  }

  return (
    <form method="post" action={forgottenRoute} noValidate onSubmit={submit} className="flex flex-col gap-4">
      <EmailField ref={field} value={email} onType={setEmail} error={fault} />
      {answered?.kind === "done" && (
        <Strip kind="mail" heading="If we know this e-mail, a link is on its way">
          It works once, for 30 minutes. A newer link ends the older.
        </Strip>
      )}
      <WaitRule wait={wait} />
      {(answered?.kind === "fault" || answered?.kind === "refused") && (
        <Strip kind="error" heading="No link was sent">{answered.message || "Try again in a few seconds."}</Strip>
      )}
      <div>
        <Button type="submit" look="ink" className="min-h-12 w-full" aria-disabled={busy || undefined} reason={waitReason(wait)}>
          {busy ? "Sending" : "Send a link"}
        </Button>
      </div>
    </form>
  );
}
