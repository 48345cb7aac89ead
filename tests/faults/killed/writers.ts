import { expect } from "vitest";
import { Project, Revision, type User } from "../../../models/index";
import { Receiver } from "../../../models/Receiver";
import { buildMember, buildProject, buildSession, buildTeam } from "../../build";

/** Somebody who writes one word after the other into a yard of their own, and remembers which were confirmed. */
export interface Writer {
  projectId: string;
  receiverId: string;
  cookie: string;
  revision: number;
  confirmed: string[];
  /** What was answered other than 200, with the time it took. */
  refused: { status: number; milliseconds: number }[];
}

export interface Sent {
  status: number;
  /** The revision of the answer, or the one that stands where ours was late. */
  revision?: number;
}

export async function buildWriters(count: number): Promise<Writer[]> {
  const team = await buildTeam();
  const owner: User = await buildMember(team, "owner");
  return Promise.all(
    Array.from({ length: count }, async () => {
      const { project, plan } = await buildProject(team);
      const { cookie } = await buildSession(owner);
      return { projectId: project.id, receiverId: plan.receivers[0]!.id, cookie, revision: project.revision, confirmed: [], refused: [] };
    }),
  );
}

/** Writes until `isOver`; `send` gives status 0 where there was no answer at all. */
export async function writeOn(writer: Writer, send: (writer: Writer, says: string) => Promise<Sent>, isOver: () => boolean): Promise<void> {
  for (let turn = 0; !isOver(); turn += 1) {
    const says = `word ${turn}`;
    const from = performance.now();
    const { status, revision } = await send(writer, says);
    if (revision !== undefined) writer.revision = revision;
    if (status === 200) writer.confirmed.push(says);
    else {
      writer.refused.push({ status, milliseconds: performance.now() - from });
      await new Promise((resolve) => setTimeout(resolve, 50));
    }
  }
}

/** Every confirmed word is in the record, and what was never confirmed is whole or not there at all. */
export async function expectNothingLost(writers: readonly Writer[]): Promise<void> {
  for (const { projectId, receiverId, confirmed } of writers) {
    const project = await Project.findOne({ where: { id: projectId }, rejectOnEmpty: true });
    const rows = await Revision.findAll({ where: { projectId }, order: [["revision", "ASC"]] });
    const words = rows.map(({ acts }) => (acts[0]?.after as { says: string }).says);
    expect(confirmed.filter((word) => !words.includes(word))).toEqual([]);
    expect(rows.map(({ revision }) => revision)).toEqual(rows.map((_, place) => place + 1));
    expect(project.revision).toBe(rows.length);
    const receiver = await Receiver.findOne({ where: { projectId, id: receiverId }, rejectOnEmpty: true });
    if (words.length) expect((receiver.params as { says: string }).says).toBe(words.at(-1));
  }
}
