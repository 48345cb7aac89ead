"use client";

import { useEffect, useRef, useState, type FormEvent } from "react";
import { budgetAddress, projectsAddress } from "../addresses";
import { Button, LinkButton } from "../ui/Button";
import { Select, type Choice } from "../ui/Select";
import { Sheet } from "../ui/Sheet";
import { Strip } from "../ui/Strip";
import { TextField } from "../ui/TextField";
import { useBrowserPlace } from "./browserPlace";
import { makeYard, type Made } from "./makeYard";
import { bodyOf, emptyYard, type NewYard } from "./newYard";
import { SizeFields } from "./SizeFields";
import { StartDrawing } from "./StartDrawing";

interface Props {
  teams: readonly { id: string; name: string }[];
  clocks: readonly Choice[];
  currencies: readonly Choice[];
  start: NewYard["start"];
  /** Leaves for the new yard; a whole load. */
  onMade?: (address: string) => void;
}

/** The choices with one more in front, where the browser's own is not among them. */
const withOwn = (choices: readonly Choice[], value: string): readonly Choice[] =>
  choices.some((choice) => choice.value === value) ? choices : [{ value, label: value }, ...choices];

const starts = [
  { value: "empty", label: "An empty yard", says: "Draw your own, from the fence inwards." },
  { value: "example", label: "The worked example", says: "A copy of an invented yard with every figure open: move its walls." },
] as const;

function StartChoice({ chosen, onChoose }: { chosen: NewYard["start"]; onChoose: (start: NewYard["start"]) => void }) {
  return (
    <fieldset>
      <legend className="mb-1 text-second font-semibold text-ink2">Start from</legend>
      <div className="grid gap-x-4 mid:grid-cols-2">
        {starts.map(({ value, label, says }) => (
          <label key={value} className="flex min-h-11 items-center gap-3 py-1 text-second">
            <input type="radio" name="start" value={value} checked={chosen === value} onChange={() => onChoose(value)} className="size-5 flex-none accent-ink" />
            <span>
              <span className="block font-medium text-ink">{label}</span>
              <span className="block text-ink2">{says}</span>
            </span>
          </label>
        ))}
      </div>
    </fieldset>
  );
}

export function NewYardForm({ teams, clocks, currencies, start, onMade = (address) => window.location.assign(address) }: Props) {
  const place = useBrowserPlace();
  const form = useRef<HTMLFormElement>(null);
  const [yard, setYard] = useState(emptyYard(start, teams[0]?.id ?? ""));
  const [busy, setBusy] = useState(false);
  const [made, setMade] = useState<Made>();
  const [nameless, setNameless] = useState(false);
  const change = (values: Partial<NewYard>) => {
    setYard((now) => ({ ...now, ...values }));
    setMade(undefined);
    setNameless(false);
  };
  const errors = made?.kind === "refused" ? made.fields : {};
  const timeZone = yard.timeZone ?? place.timeZone;
  const currency = yard.currency ?? place.currency;

  // What is wrong is where the reader goes on.
  const toFirstWrong = () => form.current?.querySelector<HTMLElement>("[aria-invalid='true']")?.focus();
  useEffect(() => {
    if (nameless || made?.kind === "refused") toFirstWrong();
  }, [made, nameless]);

  async function submit(event: FormEvent) {
    event.preventDefault();
    if (busy) return;
    // A field that refuses what was typed hands nothing over: it is settled first.
    if (form.current?.querySelector("[aria-invalid='true']")) return toFirstWrong();
    if (yard.name.trim() === "") return setNameless(true);
    setBusy(true);
    const answer = await makeYard(bodyOf(yard, place));
    if (answer.kind === "made") return onMade(yard.start === "example" ? budgetAddress(answer.id) : answer.next);
    setBusy(false);
    setMade(answer);
  }

  return (
    <form ref={form} noValidate onSubmit={submit} className="grid items-start gap-3 mid:gap-5 desk:grid-cols-[minmax(0,1fr)_minmax(0,24rem)] wide:grid-cols-[minmax(0,1fr)_minmax(0,30rem)]">
      <Sheet heading="What it is" className="desk:col-start-1">
        <div className="flex flex-col gap-4">
          <TextField
            label="Name"
            value={yard.name}
            maxLength={120}
            autoComplete="off"
            hint="Yours to choose: a street, a lot, a project."
            error={nameless ? "A yard needs a name." : errors.name}
            onChange={(event) => change({ name: event.target.value })}
          />
          <TextField label="In one line" value={yard.says} maxLength={400} autoComplete="off" hint="As “Drums in a shed at the back fence”. May stay empty." error={errors.says} onChange={(event) => change({ says: event.target.value })} />
          <StartChoice chosen={yard.start} onChoose={(chosen) => change({ start: chosen })} />
          <div className="grid gap-4 mid:grid-cols-2">
            <Select label="Clock of the yard" choices={withOwn(clocks, timeZone)} value={timeZone} hint="Hours of a limit are told by it." error={errors.timeZone} onChange={(event) => change({ timeZone: event.target.value })} />
            <Select label="Currency" choices={withOwn(currencies, currency)} value={currency} hint="Costs are told in it." error={errors.currency} onChange={(event) => change({ currency: event.target.value })} />
          </div>
          {teams.length > 1 && (
            <Select label="Team" choices={teams.map(({ id, name }) => ({ value: id, label: name }))} value={yard.teamId} hint="Its members see the yard." error={errors.teamId} onChange={(event) => change({ teamId: event.target.value })} />
          )}
        </div>
      </Sheet>
      {yard.start === "empty" && (
        <Sheet heading="Sizes, where you know them" says="All of this may wait. Pace it out if you must: a metre either way changes little." className="desk:col-start-1">
          <div className="flex flex-col gap-6">
            <SizeFields yard={yard} onChange={change} errors={errors} />
          </div>
        </Sheet>
      )}
      {yard.start === "empty" && (
        <Sheet heading="So far, from above" className="desk:col-start-2 desk:row-span-2 desk:row-start-1">
          <StartDrawing yard={yard} />
          <p className="mt-2 text-second text-ink2">The building stands in the middle of the lot and the room in the middle of the building, until you move them.</p>
        </Sheet>
      )}
      <div className="flex flex-col gap-3 desk:col-start-1">
        {made?.kind === "failed" && (
          <Strip kind="error" heading="The yard was not made">
            {made.message}
          </Strip>
        )}
        {made?.kind === "refused" && Object.keys(made.fields).length === 0 && (
          <Strip kind="error" heading="The yard was not made">
            {made.message}
          </Strip>
        )}
        <div className="flex flex-wrap gap-2.5">
          <Button type="submit" look="ink" aria-disabled={busy || undefined}>
            {busy ? "Making the yard" : "Make the yard"}
          </Button>
          <LinkButton href={projectsAddress}>Back to your yards</LinkButton>
        </div>
      </div>
    </form>
  );
}
