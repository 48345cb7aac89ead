import "server-only";
import { z } from "zod";
import type { PartKind } from "@/lib/noise/plan";
import { adoptConstruction } from "@/models/adoptConstruction";
import { filledIn } from "@/models/filledIn";
import { withOwnPower } from "@/models/ownPower";
import { addPart, changePart, partKindOf, removePart, type Act, type Place } from "@/models/parts";
import type { ActName } from "./access";
import { notFound } from "./errors";
import { isIdentifier } from "./request";
import { read } from "./sessionRoutes";

export type PartParams = { projectId: string; part: string };
export type OnePartParams = PartParams & { partId: string };

/** The act of the table of rights that a change of this kind of part is. */
export function actOnPart({ part }: PartParams): ActName {
  return part === "criteria" ? "set limit" : "edit plan";
}

/** The kind of part an address speaks of; an address that cannot be read speaks of nothing. */
export function kindOf({ part, partId }: PartParams & { partId?: string }): PartKind {
  const kind = partKindOf(part);
  if (!kind || (partId !== undefined && !isIdentifier(partId))) throw notFound();
  return kind;
}

const choice = z.strictObject({ catalogueKey: z.string().min(1).max(120) });

type Values = Record<string, unknown>;

/** Adds one part. Its id is given here, not by the asker; an element's construction may be one of the catalogue. */
export async function addOne(place: Place, params: PartParams, body: Values): Promise<Act[]> {
  const kind = kindOf(params);
  const { id: _, ...values } = body;
  if (kind !== "element" || values.construction === undefined) return addPart(place, kind, filledIn(kind, values));
  const { construction, ...bare } = values;
  const added = await addPart(place, kind, { ...bare, constructionId: null });
  return [...added, ...(await changeOne(place, { ...params, partId: added[0]!.id }, { construction }))];
}

/**
 * Changes one part. An element may name a construction of the catalogue: its record is copied into the project first. Of a
 * source levels may be given that were measured beside it (`measured`): what is stored is the power behind them.
 */
export async function changeOne(place: Place, params: OnePartParams, body: Values): Promise<Act[]> {
  const kind = kindOf(params);
  if (kind === "source" && body.measured !== undefined) return changePart(place, kind, params.partId, await withOwnPower(place, params.partId, body));
  const { construction, ...patch } = body;
  if (kind !== "element" || construction === undefined) return changePart(place, kind, params.partId, filledIn(kind, body));
  const { catalogueKey } = read(choice, construction);
  const { act, constructionId, suggested } = await adoptConstruction(place, params.partId, catalogueKey);
  const chosen = { ...patch, constructionId, params: { ...suggested, ...(patch.params as object | undefined) } }; // checked whole
  return [...(act ? [act] : []), ...(await changePart(place, kind, params.partId, chosen))];
}

export const removeOne = (place: Place, params: OnePartParams) => removePart(place, kindOf(params), params.partId);
