"use client";

import Link from "next/link";
import type { ReactNode } from "react";
import type { Plan } from "../../lib/noise/plan";
import { elementAddress, roomsAddress, sourcesAddress, limitsAddress } from "../addresses";
import { Icon } from "../marks/Icon";
import { changeOf, type FieldSpec } from "../plan/fieldSpec";
import { SpecFields } from "../plan/SpecFields";
import type { PlannedSave } from "../plan/usePlannedSave";
import type { PlanSave } from "../plan/usePlanSave";
import { Button } from "../ui/Button";
import type { Spot } from "./geometry";
import { lotSpecs, treeSpecs } from "./lotSpecs";
import { additionOf } from "./newThings";
import { OutlineFields } from "./OutlineFields";
import type { Thing } from "./things";
import { buildingSpecs, fenceSpecs, floorSpecs, placeSpecs, receiverSpecs, sourceSpecs } from "./thingSpecs";

interface Props {
  thing: Thing;
  plan: Plan;
  /** Where a thing without a place is put by its first figure. */
  start: Spot;
  spot: string;
  save: PlanSave;
  planned: PlannedSave;
  locked: boolean;
}

/** Fields of the lit thing. */
export function ThingFields(props: Props) {
  const { thing, plan, start } = props;
  const { id } = thing;
  switch (thing.part) {
    case "lots":
      return <LotFields {...props} />;
    case "buildings": {
      const building = plan.buildings.find((one) => one.id === id);
      return building ? <BuildingFields {...props} building={building} /> : null;
    }
    case "fences": {
      const fence = plan.fences.find((one) => one.id === id);
      return fence ? <Specs {...props} specs={fenceSpecs(fence)} /> : null;
    }
    case "receivers": {
      const receiver = plan.receivers.find((one) => one.id === id);
      return receiver ? (
        <Specs {...props} specs={receiverSpecs(receiver, plan, start)}>
          <More href={limitsAddress(props.save.projectId)}>What this listener may hear</More>
        </Specs>
      ) : null;
    }
    case "sources":
    case "outlets": {
      const source = plan[thing.part].find((one) => one.id === id);
      return source ? (
        <Specs {...props} specs={sourceSpecs(thing.part, source, start)}>
          <More href={sourcesAddress(props.save.projectId)}>How loud it is</More>
        </Specs>
      ) : null;
    }
    case "elements": {
      const element = plan.elements.find((one) => one.id === id);
      return element ? (
        <Specs {...props} specs={placeSpecs("elements", element, start)}>
          <More href={elementAddress(props.save.projectId, id)}>What it is made of, and all its figures</More>
        </Specs>
      ) : null;
    }
    case "trees":
      return (
        <Specs {...props} specs={treeSpecs(plan, Number(id))}>
          <p className="mt-3 text-second text-ink2">Trees are drawn. A garden tree holds back nothing that could be relied on.</p>
        </Specs>
      );
  }
}

function Specs({ specs, children, spot, save, planned, locked }: Props & { specs: readonly FieldSpec[]; children?: ReactNode }) {
  return (
    <>
      <SpecFields specs={specs} spot={spot} save={save} planned={planned} locked={locked} />
      {children}
    </>
  );
}

function More({ href, children }: { href: string; children: ReactNode }) {
  return (
    <Link href={href} className="mt-3 inline-flex min-h-6 items-center text-second font-semibold">
      {children}
    </Link>
  );
}

function Part({ heading, children }: { heading: string; children: ReactNode }) {
  return (
    <section className="mt-5">
      <h3 className="mb-2 text-part">{heading}</h3>
      {children}
    </section>
  );
}

function LotFields(props: Props) {
  const { plan, spot, planned, locked } = props;
  const { outline, id } = plan.lot;
  return (
    <>
      <Part heading="Outline">
        {outline ? (
          <OutlineFields {...props} of={{ part: "lots", id }} outline={outline} />
        ) : (
          <>
            <p className="text-second text-ink2">Not drawn yet. Pace it out if you must: a metre either way changes little.</p>
            {!locked && (
              <Button look="ink" className="mt-3" onClick={() => void planned((now) => additionOf(now, "lots"), `${spot}/corners`)}>
                Draw a rectangle
              </Button>
            )}
          </>
        )}
      </Part>
      <Part heading="Ground and air">
        <Specs {...props} specs={lotSpecs(plan)} />
      </Part>
    </>
  );
}

const STOREY = 2.8;

function BuildingFields({ building, ...props }: Props & { building: Plan["buildings"][number] }) {
  const { plan, spot, planned, locked, save } = props;
  const { id, footprint, floors } = building;
  const rooms = plan.spaces.filter(({ buildingId }) => buildingId === id);
  const setFloors = (change: (standing: number[]) => number[]) => () =>
    void planned((now) => changeOf("buildings", id, { floors: change(now.buildings.find((one) => one.id === id)?.floors ?? []) }), `${spot}/floors`);
  return (
    <>
      <Specs {...props} specs={buildingSpecs(building)} />
      <Part heading="Outline">
        {footprint ? (
          <OutlineFields {...props} of={{ part: "buildings", id }} outline={footprint} />
        ) : (
          <Button look="ink" reason={locked ? "Not drawn yet." : undefined} onClick={() => void planned(() => changeOf("buildings", id, { footprint: square(props.start) }), spot)}>
            Draw a rectangle
          </Button>
        )}
        {rooms.length > 0 && !locked && <p className="mt-2 text-second text-ink2">Moved as a whole, it takes its rooms and their walls along. Grown or turned, it leaves them where they are.</p>}
      </Part>
      <Part heading="Floors">
        <Specs {...props} specs={floorSpecs(building)} />
        {!locked && (
          <div className="mt-3 flex flex-wrap gap-2">
            {floors.length < 10 && (
              <Button icon={<Icon name="plus" />} onClick={setFloors((standing) => [...standing, standing.length === 0 ? 0 : Number((standing[standing.length - 1]! + STOREY).toFixed(3))])}>
                Add a floor
              </Button>
            )}
            {floors.length > 0 && <Button onClick={setFloors((standing) => standing.slice(0, -1))}>Remove the top floor</Button>}
          </div>
        )}
      </Part>
      <More href={roomsAddress(save.projectId)}>{rooms.length > 0 ? "Its rooms" : "Give it rooms"}</More>
    </>
  );
}

const square = ([x, y]: Spot) => [[x - 3, y - 2], [x + 3, y - 2], [x + 3, y + 2], [x - 3, y + 2]];
