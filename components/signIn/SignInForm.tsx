"use client";

import Link from "next/link";
import { useRef, useState, type FormEvent } from "react";
import { forgottenAddress, sessionRoute } from "../addresses";
import { capitalise } from "../format";
import { Button } from "../ui/Button";
import { Checkbox } from "../ui/Checkbox";
import { Strip } from "../ui/Strip";
import { EmailField } from "./EmailField";
import { PasswordField } from "./PasswordField";
import { signIn, type SignInOutcome } from "./signIn";
import { useWait } from "./useWait";
import { waitReason, WaitRule } from "./WaitRule";

interface Props {
  /** Where to go after it, when a page asked for the sign-in. */
  next?: string;
  /** Said above the fields, as when the connection is not encrypted. */
  notice?: string;
  /** Leaves for the next page; a whole load, so that every part of it knows who is here. */
  onSignedIn?: (next: string) => void;
}

function emptyField(email: string, password: string): "email" | "password" | undefined {
  if (email.trim() === "") return "email";
  return password === "" ? "password" : undefined;
}

function OutcomeStrip({ outcome }: { outcome: SignInOutcome | undefined }) {
  if (outcome?.kind === "fault") return <Strip kind="error" heading="Cannot sign in just now">{outcome.message}</Strip>;
  if (outcome?.kind === "unchecked") return <Strip kind="mail" heading="Look in your mail first">{capitalise(outcome.message.replace(/^Look in your mail first: ?/, ""))}</Strip>;
  return null;
}

export function SignInForm({ next, notice, onSignedIn = (path) => window.location.assign(path) }: Props) {
  const [email, setEmail] = useState("");
  const [password, setPassword] = useState("");
  const [keep, setKeep] = useState(false);
  const [busy, setBusy] = useState(false);
  const [missing, setMissing] = useState<"email" | "password">();
  const [outcome, setOutcome] = useState<SignInOutcome>();
  const [wait, beginWait, forgetWait] = useWait();
  const emailField = useRef<HTMLInputElement>(null);
  const passwordField = useRef<HTMLInputElement>(null);

  function receive(result: SignInOutcome) {
    if (result.kind === "in") return onSignedIn(result.next);
    setBusy(false);
    setOutcome(result);
    if (result.kind === "wait") beginWait(result.seconds, result.message);
    if (result.kind !== "refused") return;
    setPassword("");
    passwordField.current?.focus();
  }

  async function submit(event: FormEvent) {
    event.preventDefault();
    if (busy || wait.left > 0) return;
    const empty = emptyField(email, password);
    setMissing(empty);
    setOutcome(undefined);
    forgetWait();
    if (empty) return (empty === "email" ? emailField : passwordField).current?.focus();
    setBusy(true);
    receive(await signIn({ email: email.trim(), password, keep, next }));
  }

  const refusal = outcome?.kind === "refused" ? outcome.message : undefined;
  return (
    // Without script the browser posts the fields, so that no password ever stands in an address.
    <form method="post" action={sessionRoute} noValidate onSubmit={submit} className="flex flex-col gap-4">
      {notice && <Strip kind="note" heading={notice} />}
      <EmailField ref={emailField} value={email} onType={setEmail} error={missing === "email" ? "Type the e-mail you are known by." : undefined} />
      <PasswordField
        ref={passwordField}
        label="Password"
        name="password"
        autoComplete="current-password"
        value={password}
        onType={setPassword}
        error={missing === "password" ? "Type your password." : refusal}
      />
      <Checkbox
        name="keep"
        label="Keep me signed in on this device"
        hint="For up to 7 days; an owner or acoustician signs in again each day."
        checked={keep}
        onChange={(event) => setKeep(event.target.checked)}
      />
      <WaitRule wait={wait}>
        A browser you signed in with before is not held back by the tries of others. If it was not you who tried,{" "}
        <Link href={forgottenAddress} className="underline">
          get a link and set a new password
        </Link>
        .
      </WaitRule>
      <OutcomeStrip outcome={outcome} />
      <div>
        <Button type="submit" look="ink" className="min-h-12 w-full" aria-disabled={busy || undefined} reason={waitReason(wait)}>
          {busy ? "Signing in" : "Sign in"}
        </Button>
      </div>
    </form>
  );
}
