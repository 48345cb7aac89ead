"use client";

import { useRef, useState, type FormEvent } from "react";
import { checkMailAddress, signUpRoute } from "../addresses";
import { Button } from "../ui/Button";
import { Strip } from "../ui/Strip";
import { TextField } from "../ui/TextField";
import { ask, type Answered } from "./ask";
import { EmailField } from "./EmailField";
import { emailFault, nameFault, newPasswordFault, passwordHint } from "./fieldChecks";
import { HatChoice, type Hat } from "./HatChoice";
import { keepMailedTo } from "./mailedTo";
import { PasswordField } from "./PasswordField";
import { useWait } from "./useWait";
import { waitReason, WaitRule } from "./WaitRule";

const FIELDS = ["name", "email", "password"] as const;
type Field = (typeof FIELDS)[number];
type Faults = Partial<Record<Field, string>>;

interface Props {
  hat: Hat;
  notice?: string;
  /** Leaves for the page that says to look in the mail. */
  onSent?: () => void;
}

function faultsOf(typed: Record<Field, string>): Faults {
  const found = { name: nameFault(typed.name), email: emailFault(typed.email), password: newPasswordFault(typed.password) };
  return Object.fromEntries(Object.entries(found).filter(([, fault]) => fault !== undefined));
}

export function SignUpForm({ hat: asked, notice, onSent = () => window.location.assign(checkMailAddress) }: Props) {
  const [typed, setTyped] = useState<Record<Field, string>>({ name: "", email: "", password: "" });
  const [hat, setHat] = useState(asked);
  const [busy, setBusy] = useState(false);
  const [faults, setFaults] = useState<Faults>({});
  const [trouble, setTrouble] = useState<string>();
  const [wait, beginWait, forgetWait] = useWait();
  const form = useRef<HTMLFormElement>(null);

  const type = (field: Field) => (value: string) => {
    setTyped((before) => ({ ...before, [field]: value }));
    setFaults((before) => ({ ...before, [field]: undefined }));
  };

  function show(found: Faults) {
    setFaults(found);
    const first = FIELDS.find((field) => found[field]);
    form.current?.querySelector<HTMLInputElement>(`[name="${first}"]`)?.focus();
  }

  function receive(answered: Answered) {
    if (answered.kind === "done") {
      keepMailedTo(typed.email.trim());
      return onSent();
    }
    setBusy(false);
    if (answered.kind === "wait") return beginWait(answered.seconds, answered.message);
    if (answered.kind === "invalid" && FIELDS.some((field) => answered.fields[field])) return show(answered.fields);
    setTrouble(answered.message || "This could not be sent. Try again in a few seconds.");
  }

  async function submit(event: FormEvent) {
    event.preventDefault();
    if (busy || wait.left > 0) return;
    const found = faultsOf(typed);
    show(found);
    setTrouble(undefined);
    forgetWait();
    if (Object.keys(found).length > 0) return;
    setBusy(true);
    receive(await ask("POST", signUpRoute, { name: typed.name.trim(), email: typed.email.trim(), password: typed.password, hat }));
  }

  return (
    <form ref={form} method="post" action={signUpRoute} noValidate onSubmit={submit} className="flex flex-col gap-4">
      {notice && <Strip kind="note" heading={notice} />}
      <TextField label="Name" name="name" autoComplete="name" maxLength={120} value={typed.name} onChange={(event) => type("name")(event.target.value)} error={faults.name} />
      <EmailField value={typed.email} onType={type("email")} error={faults.email} />
      <HatChoice chosen={hat} onChoose={setHat} />
      <PasswordField label="Password" name="password" autoComplete="new-password" hint={passwordHint} value={typed.password} onType={type("password")} error={faults.password} />
      <WaitRule wait={wait} />
      {trouble && <Strip kind="error" heading="Not signed up yet">{trouble}</Strip>}
      <div>
        <Button type="submit" look="ink" className="min-h-12 w-full" aria-disabled={busy || undefined} reason={waitReason(wait)}>
          {busy ? "Signing up" : "Sign up"}
        </Button>
      </div>
    </form>
  );
}
