import type { Transaction } from "sequelize";
import type { PartKind, Receiver, Situation } from "../lib/noise/plan";
import type { Place } from "./partTables";
import { ReceiverDistance } from "./ReceiverDistance";
import { SituationSource } from "./SituationSource";

/** The fields of parts that are tables of their own, because they point at sources. */
export const linkFields: Partial<Record<PartKind, string>> = { situation: "playing", receiver: "distances" };

type Links = Partial<Record<PartKind, Map<string, unknown>>>;

/** Links of a whole project, or of one part of it, by part. */
export async function readLinks({ projectId, transaction }: Place, kinds: readonly PartKind[] = ["situation", "receiver"]) {
  const links: Links = {};
  if (kinds.includes("situation")) links.situation = await readPlaying(projectId, transaction);
  if (kinds.includes("receiver")) links.receiver = await readDistances(projectId, transaction);
  return links;
}

async function readPlaying(projectId: string, transaction: Transaction) {
  const rows = await SituationSource.findAll({ where: { projectId }, order: [["rank", "ASC"]], raw: true, transaction });
  const playing = new Map<string, Situation["playing"]>();
  for (const { situationId, sourceId, share } of rows) {
    playing.set(situationId, [...(playing.get(situationId) ?? []), { sourceId, share }]);
  }
  return playing;
}

async function readDistances(projectId: string, transaction: Transaction) {
  const rows = await ReceiverDistance.findAll({ where: { projectId }, raw: true, transaction });
  const distances = new Map<string, Receiver["distances"]>();
  for (const { receiverId, sourceId, metres } of rows) {
    distances.set(receiverId, { ...distances.get(receiverId), [sourceId]: metres });
  }
  return distances;
}

/** Value of a link field where no row stands. */
export const noLinks = (kind: PartKind) => (kind === "situation" ? [] : {});

/** Replaces the links of one part by what the part says. */
export async function saveLinks(kind: PartKind, part: object, { projectId, transaction }: Place) {
  if (kind === "situation") await savePlaying(part as Situation, projectId, transaction); // the kind says so
  if (kind === "receiver") await saveDistances(part as Receiver, projectId, transaction);
}

async function savePlaying({ id, playing }: Situation, projectId: string, transaction: Transaction) {
  await SituationSource.destroy({ where: { projectId, situationId: id }, transaction });
  const rows = playing.map((one, rank) => ({ projectId, situationId: id, rank, ...one }));
  const fields: (keyof (typeof rows)[0])[] = ["projectId", "situationId", "sourceId", "rank", "share"];
  await SituationSource.bulkCreate(rows, { fields, transaction });
}

async function saveDistances({ id, distances }: Receiver, projectId: string, transaction: Transaction) {
  await ReceiverDistance.destroy({ where: { projectId, receiverId: id }, transaction });
  const rows = Object.entries(distances).map(([sourceId, metres]) => ({ projectId, receiverId: id, sourceId, metres }));
  await ReceiverDistance.bulkCreate(rows, { fields: ["projectId", "receiverId", "sourceId", "metres"], transaction });
}

/** Ids of the sources that a part's links point at, with the field that names each. */
export function linkedSources(kind: PartKind, part: object): { field: string; id: string }[] {
  if (kind === "situation") {
    return (part as Situation).playing.map(({ sourceId }, place) => ({ field: `playing.${place}.sourceId`, id: sourceId }));
  }
  if (kind === "receiver") return Object.keys((part as Receiver).distances).map((id) => ({ field: `distances.${id}`, id }));
  return [];
}
