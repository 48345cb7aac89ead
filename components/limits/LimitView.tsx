"use client";

import clsx from "clsx";
import Link from "next/link";
import { useId } from "react";
import type { Criterion, Receiver } from "@/lib/noise/plan";
import type { ReceiverVerdict } from "@/lib/noise/verdict";
import { elementAddress } from "../addresses";
import { Icon } from "../marks/Icon";
import { MarginWords } from "../marks/MarginWords";
import type { PlanSave } from "../plan/usePlanSave";
import { Button } from "../ui/Button";
import { Disclosure } from "../ui/Disclosure";
import { BareLedges } from "./BareLedges";
import { ClauseFields } from "./ClauseFields";
import { Deference } from "./Deference";
import { HoursField, HoursStrip } from "./HoursField";
import { ledgesOf } from "./ledges";
import { limitCautionsOf, windowAsDrawnWords, windowsOf, type LimitCaution } from "./limitCautions";
import { LimitChooser } from "./LimitChooser";
import { LimitFigures } from "./LimitFigures";
import { replaceBy, type LimitLibrary } from "./limitPatches";
import { figureWords, takenWords } from "./limitWords";
import { ReadFigures, ReadLimit } from "./ReadLimit";
import { SavedText } from "../ui/SavedText";
import type { Edits } from "./useLimitEdits";
import { WindowChoice } from "./WindowChoice";

interface Props {
  projectId: string;
  library: LimitLibrary;
  may: { edit: boolean; reason: string };
  save: PlanSave;
  edits: Edits;
  listener: Receiver;
  limits: readonly Criterion[];
  limit: Criterion | undefined;
  weighed: ReceiverVerdict | undefined;
  /** Place of the lit band in the spectra. */
  band: number | null;
  onBand: (band: number) => void;
  onLimit: (id: string) => void;
  onCopy: (libraryKey: string) => void;
  onRemove: (limit: Criterion) => void;
}

/** Several limits of one listener: which one is shown, and which one is weighed. */
function LimitCards({ limits, limit, weighed, onLimit }: Pick<Props, "limits" | "limit" | "weighed" | "onLimit">) {
  const id = useId();
  if (limits.length < 2) return null;
  return (
    <fieldset className="mb-5 min-w-0">
      <legend className="mb-1.5 text-second font-semibold text-ink2">Limits of this listener</legend>
      <div className="grid gap-2 mid:grid-cols-2">
        {limits.map((each) => (
          <label key={each.id} className={clsx("min-w-0 cursor-pointer rounded-control border-[1.5px] border-edge px-3 py-2 hover:border-ink has-checked:border-2 has-checked:border-ink has-checked:bg-lampwash has-focus-visible:outline-3 has-focus-visible:outline-offset-2 has-focus-visible:outline-lamp")}>
            <input type="radio" name={id} checked={each.id === limit?.id} onChange={() => onLimit(each.id)} className="sr-only" />
            <span className="block font-semibold wrap-anywhere">{each.name}</span>
            <span className="block text-second text-ink2">{figureWords(each)}</span>
            {weighed?.criterionId === each.id ? <MarginWords state={weighed.state} margin={weighed.margin} className="text-second" /> : <span className="text-second text-ink2">more room left than the weighed one</span>}
          </label>
        ))}
      </div>
    </fieldset>
  );
}

function Cautions({ projectId, cautions }: { projectId: string; cautions: readonly LimitCaution[] }) {
  return cautions.map(({ heading, words, elementId }) => (
    <div key={heading} className="flex gap-3 rounded-control border border-ink p-4">
      <Icon name="hand" />
      <div className="min-w-0">
        <h3 className="text-part">{heading}</h3>
        <p className="mt-1 text-second text-ink2">{words}</p>
        {elementId && (
          <Link href={elementAddress(projectId, elementId)} className="inline-flex min-h-6 items-center text-second font-semibold">
            Open the window
          </Link>
        )}
      </div>
    </div>
  ));
}

/** One listener's limit: its words and hours, then the bare ledges with the figures. */
export function LimitView(props: Props) {
  const { limit, may, library, save, listener, onCopy } = props;
  if (!limit) {
    return (
      <div className="grid min-w-0 content-start gap-5 border-rule p-4 mid:p-6.5 wide:border-l">
        <div className="max-w-xl">
          <h2 className="text-section">No limit yet</h2>
          <p className="mt-1 mb-4 text-ink2">{listener.name} is not weighed. {may.edit ? "Choose one to copy, or take “Own figures” and type your nine." : ""}</p>
          {may.edit && (
            <LimitChooser records={library.records} label="A limit of the library" verb="Copy this limit" saving={save.saving} error={save.errorOf(`${listener.id} limit`)} onCopy={onCopy} />
          )}
        </div>
        <Deference />
      </div>
    );
  }
  return <Standing {...props} limit={limit} />;
}

function Standing(props: Props & { limit: Criterion }) {
  const { projectId, library, may, save, listener, limit, weighed, band, onBand, edits } = props;
  const { plan, verdict } = save.answer;
  const ledges = ledgesOf(limit, weighed);
  const cautions = limitCautionsOf({ plan, verdict, listener, limit, library });
  const windows = windowsOf({ plan, verdict, listener });
  return (
    <div className="min-w-0 border-rule wide:border-l">
      <div className="grid desk:grid-cols-[minmax(0,1fr)_minmax(280px,340px)]">
        <section aria-labelledby="clause" className="min-w-0 p-4 mid:p-6.5">
          <LimitCards {...props} />
          <h2 id="clause" className="mb-3 text-section">
            The clause
          </h2>
          {may.edit ? (
            <div key={limit.id} className="grid gap-4">
              <SavedText label="Name of this limit" value={limit.name} most={120} needed error={edits.errorOf(limit.id, "name")} onCommit={(name) => void edits.limit(limit.id, "name", () => ({ name }))} />
              <ClauseFields limit={limit} edits={edits} />
            </div>
          ) : (
            <ReadLimit limit={limit} />
          )}
        </section>
        <section aria-labelledby="hours" className="grid min-w-0 content-start gap-6 border-rule p-4 mid:p-6.5 max-desk:border-t desk:border-l">
          <div>
            <h2 id="hours" className="mb-2 text-part">
              Hours
            </h2>
            {may.edit ? (
              <HoursField key={limit.id} hours={limit.hours} error={edits.errorOf(limit.id, "hours")} onChange={(hours) => void edits.limit(limit.id, "hours", () => ({ hours }))} />
            ) : (
              <HoursStrip hours={limit.hours} />
            )}
          </div>
          {may.edit && listener.kind === "room" && (
            <WindowChoice value={limit.window} error={edits.errorOf(limit.id, "window")} onChoose={(window) => void edits.limit(limit.id, "window", () => ({ window }))} />
          )}
          {windows.map((drawn) => (
            <p key={drawn.id} className="text-second text-ink2 wrap-anywhere">
              {windowAsDrawnWords(drawn)}
            </p>
          ))}
        </section>
      </div>
      <section aria-labelledby="bare" className="border-t border-rule p-4 mid:p-6.5">
        <div className="mb-3 flex flex-wrap items-baseline justify-between gap-x-4">
          <h2 id="bare" className="text-section">
            The limit, bare
          </h2>
          <p className="text-second text-ink2 wrap-anywhere">{takenWords(limit)}</p>
        </div>
        <BareLedges name={limit.name} ledges={ledges} lit={band} onLight={onBand} />
        <div className="mt-5">
          {may.edit ? <LimitFigures key={limit.id} limit={limit} library={library} edits={edits} lit={band} onLight={onBand} /> : <ReadFigures limit={limit} />}
        </div>
      </section>
      <section aria-label="What to know of this limit" className="grid gap-3 border-t border-rule p-4 mid:p-6.5 desk:grid-cols-2">
        <Cautions projectId={projectId} cautions={cautions} />
        <Deference />
      </section>
      {may.edit && <Actions {...props} />}
    </div>
  );
}

function Actions({ library, save, edits, listener, limit, onCopy, onRemove }: Props & { limit: Criterion }) {
  const shared = { records: library.records, saving: save.saving };
  return (
    <div className="grid gap-2 border-t border-rule p-4 mid:p-6.5">
      <Disclosure summary="Another limit for this listener">
        <div className="max-w-xl pt-2">
          <LimitChooser {...shared} label="A limit of the library" verb="Copy it beside this one" error={save.errorOf(`${listener.id} limit`)} onCopy={onCopy} />
        </div>
      </Disclosure>
      <Disclosure summary="Replace this limit">
        <div className="max-w-xl pt-2">
          <LimitChooser {...shared} label="A limit of the library" verb="Put it in its place" error={edits.errorOf(limit.id, "libraryKey")} onCopy={(key) => void edits.limit(limit.id, "libraryKey", (standing) => replaceBy(key, standing))} />
          <p className="mt-2">Hours, window and the night itself stay; name, figures and words of the old clause go.</p>
        </div>
      </Disclosure>
      <div>
        <Button onClick={() => onRemove(limit)}>Remove this limit</Button>
        {save.errorOf(`${limit.id} remove`) && <p role="alert" className="mt-2 text-second font-semibold text-over">{save.errorOf(`${limit.id} remove`)}</p>}
      </div>
    </div>
  );
}
