import "server-only";
import { z } from "zod";
import type { PartKind } from "@/lib/noise/plan";
import { adoptConstruction } from "@/models/adoptConstruction";
import { changePart, partKindOf, type Act, type Place } from "@/models/parts";
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

/** Changes one part. An element may name a construction of the catalogue: its record is copied into the project first. */
export async function changeOne(place: Place, params: OnePartParams, body: Record<string, unknown>): Promise<Act[]> {
  const kind = kindOf(params);
  const { construction, ...patch } = body;
  if (kind !== "element" || construction === undefined) return changePart(place, kind, params.partId, body);
  const { catalogueKey } = read(choice, construction);
  const { act, constructionId, suggested } = await adoptConstruction(place, params.partId, catalogueKey);
  const chosen = { ...patch, constructionId, params: { ...suggested, ...(patch.params as object | undefined) } }; // checked whole
  return [...(act ? [act] : []), ...(await changePart(place, kind, params.partId, chosen))];
}
