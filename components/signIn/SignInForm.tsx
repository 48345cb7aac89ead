"use client";

import { useRef, useState, type FormEvent } from "react";
import { sessionRoute } from "../addresses";
import { Button } from "../ui/Button";
import { Checkbox } from "../ui/Checkbox";
import { Strip } from "../ui/Strip";
import { TextField } from "../ui/TextField";
import { signIn, type SignInOutcome } from "./signIn";

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

export function SignInForm({ next, notice, onSignedIn = (path) => window.location.assign(path) }: Props) {
  const [email, setEmail] = useState("");
  const [password, setPassword] = useState("");
  const [keep, setKeep] = useState(false);
  const [shown, setShown] = useState(false);
  const [busy, setBusy] = useState(false);
  const [missing, setMissing] = useState<"email" | "password">();
  const [outcome, setOutcome] = useState<SignInOutcome>();
  const emailField = useRef<HTMLInputElement>(null);
  const passwordField = useRef<HTMLInputElement>(null);

  function receive(result: SignInOutcome) {
    if (result.kind === "in") return onSignedIn(result.next);
    setBusy(false);
    setOutcome(result);
    if (result.kind !== "refused") return;
    setPassword("");
    passwordField.current?.focus();
  }

  async function submit(event: FormEvent) {
    event.preventDefault();
    if (busy) return;
    const empty = emptyField(email, password);
    setMissing(empty);
    setOutcome(undefined);
    if (empty) return (empty === "email" ? emailField : passwordField).current?.focus();
    setBusy(true);
    receive(await signIn({ email: email.trim(), password, keep, next }));
  }

  const refusal = outcome?.kind === "refused" ? outcome.message : undefined;
  return (
    // Without script the browser posts the fields, so that no password ever stands in an address.
    <form method="post" action={sessionRoute} noValidate onSubmit={submit} className="flex flex-col gap-4">
      {notice && <Strip kind="note" heading={notice} />}
      <TextField
        ref={emailField}
        label="E-mail"
        name="email"
        type="email"
        autoComplete="username"
        inputMode="email"
        spellCheck={false}
        value={email}
        onChange={(event) => setEmail(event.target.value)}
        error={missing === "email" ? "Type the e-mail you are known by." : undefined}
      />
      <TextField
        ref={passwordField}
        label="Password"
        name="password"
        type={shown ? "text" : "password"}
        autoComplete="current-password"
        spellCheck={false}
        autoCapitalize="none"
        value={password}
        onChange={(event) => setPassword(event.target.value)}
        error={missing === "password" ? "Type your password." : refusal}
        beside={
          <Button className="flex-none" aria-label={shown ? "Hide the password" : "Show the password"} onClick={() => setShown(!shown)}>
            {shown ? "Hide" : "Show"}
          </Button>
        }
      />
      <Checkbox
        name="keep"
        label="Keep me signed in on this device"
        hint="For up to 7 days; an owner or acoustician signs in again each day."
        checked={keep}
        onChange={(event) => setKeep(event.target.checked)}
      />
      {outcome?.kind === "wait" && <Strip kind="wait" heading="Wait a little">{outcome.message}</Strip>}
      {outcome?.kind === "fault" && <Strip kind="error" heading="Cannot sign in just now">{outcome.message}</Strip>}
      <Button type="submit" look="ink" className="w-full" aria-disabled={busy || undefined}>
        {busy ? "Signing in" : "Sign in"}
      </Button>
    </form>
  );
}
