"use client";

import clsx from "clsx";
import type { Situation } from "@/lib/noise/plan";
import type { Source } from "@/lib/noise/sources";
import { listWords, percent } from "../format";
import { SavedText } from "../ui/SavedText";
import { Icon } from "../marks/Icon";
import { Button } from "../ui/Button";
import { Checkbox } from "../ui/Checkbox";
import { NumberField } from "../ui/NumberField";
import { Sheet } from "../ui/Sheet";
import { Tag } from "../ui/Tag";
import { addSituation, restoreSituation, setShare } from "./changes";
import type { SourceDesk } from "./desk";
import { leadsFor, shareWords } from "./sourceWords";

/** What plays together, and how much of the time: every situation is weighed, and each listener's worst one leads. */
export function Situations({ desk }: { desk: SourceDesk }) {
  const { plan } = desk.answer;
  const add = () => void desk.act(addSituation, "add situation");
  return (
    <Sheet
      id="situations"
      heading="What plays at once"
      beside={
        !desk.locked && (
          <Button icon={<Icon name="plus" size={18} />} onClick={add}>
            Add a situation
          </Button>
        )
      }
      className="mb-5"
    >
      <p className="max-w-[70ch] text-second text-ink2">
        Every situation is weighed for every listener; the one that leaves least room leads, and the sentence names it. A source that is not named in a situation is off there. {averagingWords(desk)}
      </p>
      {desk.save.errorOf("add situation") && <p className="mt-2 text-second font-semibold text-over">{desk.save.errorOf("add situation")}</p>}
      {plan.situations.length === 0 && <p className="mt-4 font-semibold">No situation yet: everything is taken to play at once and all the time.</p>}
      <div className={clsx("mt-4 grid gap-x-8 gap-y-6", plan.situations.length > 1 && "desk:grid-cols-2")}>
        {plan.situations.map((situation) => (
          <SituationBlock key={situation.id} desk={desk} situation={situation} />
        ))}
      </div>
    </Sheet>
  );
}

/** Whether shares of the time count for any limit of this yard. */
function averagingWords({ answer: { plan } }: SourceDesk): string {
  const whole = plan.criteria.filter(({ averaging }) => averaging === "whole");
  if (plan.criteria.length === 0) return "Shares of the time count once a limit is averaged over the whole period.";
  if (whole.length === 0) return "All limits here look at the loudest quarter hour, so a running source counts in full and shares of the time change nothing now.";
  if (whole.length === plan.criteria.length) return "All limits here are averaged over the whole period: a source counts with its share of the time.";
  const names = whole.map(({ receiverId }) => plan.receivers.find(({ id }) => id === receiverId)?.name ?? "a listener");
  return `Shares of the time count for ${listWords([...new Set(names)])}; the other limits look at the loudest quarter hour and take a running source in full.`;
}

function SituationBlock({ desk, situation }: { desk: SourceDesk; situation: Situation }) {
  const { answer, save, act, locked } = desk;
  const { id, name } = situation;
  const leads = leadsFor(situation, answer);
  const change = (patch: Record<string, unknown>) => void act(() => [{ act: "change", part: "situations", id, patch }], id);
  const undo = { words: `${name} removed.`, changes: () => restoreSituation(situation) };
  return (
    <section aria-label={name} className="min-w-0 border-t-2 border-ink pt-3">
      {leads.length > 0 && (
        <p className="mb-2">
          <Tag>Leads for {listWords(leads)}</Tag>
        </p>
      )}
      {locked ? (
        <p className="break-words">
          <b>{name}</b>
          {situation.says && `: “${situation.says} …”`}
        </p>
      ) : (
        <div className="grid gap-3 mid:grid-cols-2">
          <SavedText label="Name of the situation" value={name} most={120} needed error={save.errorOf(id, "name")} onCommit={(next) => change({ name: next })} />
          <SavedText label="How the sentence begins" value={situation.says} most={120} hint={situation.says ? undefined : "As in “On a still night at 23:00”."} error={save.errorOf(id, "says")} onCommit={(says) => change({ says })} />
        </div>
      )}
      <ul className="mt-3">
        {answer.plan.sources.map((source) => (
          <PlayingRow key={source.id} desk={desk} situation={situation} source={source} />
        ))}
      </ul>
      {situation.playing.length === 0 && <p className="mt-2 text-second font-semibold text-ink2">Nothing plays in this situation: it is silent.</p>}
      {save.errorOf(id) && <p className="mt-2 text-second font-semibold text-over">{save.errorOf(id)}</p>}
      {!locked && (
        <Button className="mt-3" icon={<Icon name="remove" size={18} />} onClick={() => void act(() => [{ act: "remove", part: "situations", id }], id, undo)}>
          Remove this situation
        </Button>
      )}
    </section>
  );
}

function PlayingRow({ desk, situation, source }: { desk: SourceDesk; situation: Situation; source: Source }) {
  const share = situation.playing.find(({ sourceId }) => sourceId === source.id)?.share ?? null;
  const set = (next: number | null) =>
    void desk.act(({ situations }) => {
      const standing = situations.find(({ id }) => id === situation.id);
      return standing ? setShare(standing, source.id, next) : [];
    }, situation.id);
  if (desk.locked)
    return (
      <li className="flex flex-wrap justify-between gap-x-4 border-t border-rule py-2">
        <span className="min-w-0 break-words">{source.name}</span>
        <span className="text-second text-ink2">{share === null ? "off" : percent(share)}</span>
      </li>
    );
  return (
    <li className="flex min-h-12 flex-wrap items-center gap-x-4 gap-y-2 border-t border-rule py-2">
      <Checkbox label={<span className="break-words">{source.name}</span>} checked={share !== null} onChange={(event) => set(event.target.checked ? 1 : null)} className="min-w-0 flex-[1_1_9rem]" />
      <span className="text-second text-ink2 max-mid:order-last max-mid:basis-full max-mid:pl-8">{share === null ? "off" : shareWords(share)}</span>
      {share !== null && (
        <NumberField
          label={<span className="sr-only">Share of the time, {source.name}</span>}
          className="w-28 flex-none"
          unit="%"
          min={0.1}
          max={100}
          step={5}
          value={Math.round(share * 1000) / 10}
          error={desk.save.errorOf(situation.id, `playing.${situation.playing.findIndex(({ sourceId }) => sourceId === source.id)}.share`)}
          onCommit={(figure) => figure !== null && set(figure / 100)}
        />
      )}
    </li>
  );
}
