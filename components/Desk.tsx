"use client";

import clsx from "clsx";
import { useAtomValue } from "jotai";
import { useEffect, useRef, useState } from "react";
import { elementAddress, limitsAddress } from "./addresses";
import { answerAtom, type Answer } from "./state/plan";
import { PlanProvider } from "./state/PlanProvider";
import { SmallBeam } from "./marks/SmallBeam";
import { Button, LinkButton } from "./ui/Button";
import { useWidthClass } from "./ui/useWidthClass";
import { BasketPanel } from "./verdict/BasketPanel";
import { ChartPanel } from "./verdict/ChartPanel";
import { inSentence } from "./verdict/chartWords";
import { DoubtPanel } from "./verdict/DoubtPanel";
import { leverOf, openableId, tryWords } from "./verdict/lever";
import { ListenerList, type Listener } from "./verdict/ListenerList";
import { NightSlab } from "./verdict/NightSlab";
import { useLit, type Lit } from "./verdict/useLit";

const DOUBTS = "doubts";

interface Props {
  projectId: string;
  answer: Answer;
  /** Whoever may not change the walls is led to look at them. */
  mayEdit: boolean;
  /** An acoustician begins with the doubts. */
  doubtsFirst?: boolean;
}

function useListeners(): Listener[] {
  const { plan, verdict } = useAtomValue(answerAtom);
  return verdict.receivers.flatMap((weighed) => {
    const receiver = plan.receivers.find(({ id }) => id === weighed.receiverId);
    return receiver ? [{ receiver, weighed }] : [];
  });
}

function focusOn(id: string) {
  const target = document.getElementById(id);
  target?.focus({ preventScroll: true });
  target?.scrollIntoView?.({ block: "nearest" });
}

/** The first lever of the verdict, and the way to its doubts. */
function SlabActions({ projectId, lit, mayEdit, open, onDoubts }: Omit<Props, "answer" | "doubtsFirst"> & { lit: Lit; open: boolean; onDoubts: () => void }) {
  const { reading, columns } = lit;
  if (!reading) return null;
  const leading = columns.find(({ band, index }) => (reading.weighed.weighted ? index === null : band === reading.weighed.band));
  const lever = leading && reading.weighed.state !== "under" ? leverOf(reading.plan, reading.weighed, leading) : null;
  const leverId = lever && openableId(reading.plan, lever);
  return (
    <>
      {lever && leverId && (
        <LinkButton look="lamp" href={elementAddress(projectId, leverId)}>
          {mayEdit ? tryWords(lever) : `Open ${inSentence(lever.name)}`}
        </LinkButton>
      )}
      {reading.weighed.metric === "none" && (
        <LinkButton look="lamp" href={limitsAddress(projectId)}>
          Choose a limit
        </LinkButton>
      )}
      <Button aria-expanded={open} aria-controls={DOUBTS} onClick={onDoubts}>
        How sure is this?
      </Button>
    </>
  );
}

/** The shape of the answer, before there is anybody to weigh it for. */
function NobodyListens({ projectId }: { projectId: string }) {
  return (
    <section aria-labelledby="listening" className="mt-3 rounded-sheet border-[1.5px] border-dashed border-edge bg-sheet p-4 mid:mt-5 mid:p-6.5">
      <h2 id="listening" className="mb-3 text-section">Who is listening</h2>
      <SmallBeam state="not weighed" margin={null} />
      <p className="mt-2 mb-4 text-ink2">No one yet, so there is no limit to hold the levels against.</p>
      <LinkButton look="ink" href={limitsAddress(projectId)}>Add a listener to weigh it</LinkButton>
    </section>
  );
}

function Panels({ projectId, lit }: { projectId: string; lit: Lit }) {
  const listeners = useListeners();
  const chartFirst = [720, 1024].includes(useWidthClass());
  const { reading, column } = lit;
  if (!reading || !column) return <NobodyListens projectId={projectId} />;
  const chart = (
    <div key="chart" className="min-w-0 border-rule max-mid:border-t mid:max-wide:col-span-2 mid:max-wide:border-b wide:border-x">
      <ChartPanel lit={lit} reading={reading} column={column} />
    </div>
  );
  const listening = (
    <section key="listening" aria-labelledby="listening" className={clsx("min-w-0 border-rule pt-4 mid:pt-6.5", chartFirst && "border-r")}>
      <h2 id="listening" className="mb-3 px-4 text-section mid:px-6.5">Who is listening</h2>
      <ListenerList listeners={listeners} litId={reading.receiver.id} onLight={lit.lightListener} onOpen={() => focusOn("verdict")} />
    </section>
  );
  const basket = (
    <div key="basket" className="min-w-0 border-rule max-mid:border-t">
      <BasketPanel projectId={projectId} lit={lit} reading={reading} column={column} />
    </div>
  );
  return (
    <div className="mt-3 grid rounded-sheet bg-sheet mid:mt-5 mid:grid-cols-2 wide:grid-cols-[minmax(236px,276px)_minmax(0,1fr)_minmax(300px,338px)]">
      {chartFirst ? [chart, listening, basket] : [listening, chart, basket]}
    </div>
  );
}

function Budget({ projectId, mayEdit, doubtsFirst = false }: Omit<Props, "answer">) {
  const lit = useLit();
  const [open, setOpen] = useState(doubtsFirst);
  const asked = useRef(false);
  useEffect(() => {
    if (open && asked.current) focusOn(`${DOUBTS}-head`);
  }, [open]);
  const toggle = () => {
    asked.current = true;
    setOpen((before) => !before);
  };
  const { reading, column } = lit;
  return (
    <>
      <NightSlab reading={reading} column={column ?? undefined} actions={reading && <SlabActions projectId={projectId} lit={lit} mayEdit={mayEdit} open={open} onDoubts={toggle} />} />
      {reading && open && <DoubtPanel id={DOUBTS} listener={reading.receiver.name} weighed={reading.weighed} />}
      <Panels projectId={projectId} lit={lit} />
    </>
  );
}

/** The budget of one yard: the sentence, who listens, what each band has left, and by which way it gets there. */
export function Desk({ projectId, answer, ...reader }: Props) {
  return (
    <PlanProvider key={projectId} answer={answer}>
      <Budget projectId={projectId} {...reader} />
    </PlanProvider>
  );
}
