import { Op } from "sequelize";
import { beforeAll, describe, expect, it } from "vitest";
import type { PartKind } from "../../lib/noise/plan";
import { Part } from "../../models/Part";
import { changePart } from "../../models/parts";
import { partKinds, partTables } from "../../models/partTables";
import { ReceiverDistance } from "../../models/ReceiverDistance";
import { buildProject, buildTeam, type BuiltProject } from "../build";
import { faultOf } from "./trial";

let built: BuiltProject;
let other: BuiltProject;
beforeAll(async () => {
  const team = await buildTeam();
  built = await buildProject(team);
  other = await buildProject(team);
});

describe("belonging", () => {
  const strangers: [PartKind, string, (stranger: BuiltProject) => object][] = [
    ["element", "yard-door", (stranger) => ({ pathId: stranger.plan.paths[0]!.id })],
    ["element", "yard-door", (stranger) => ({ constructionId: stranger.plan.constructions[0]!.id })],
    ["source", "kit", (stranger) => ({ spaceId: stranger.plan.spaces[0]!.id })],
    ["receiver", "no9-bedroom", (stranger) => ({ spaceId: stranger.plan.spaces[0]!.id })],
    ["receiver", "no9-bedroom", (stranger) => ({ distances: { [stranger.plan.sources[0]!.id]: 2 } })],
    ["situation", "still-night", (stranger) => ({ playing: [{ sourceId: stranger.plan.sources[0]!.id, share: 1 }] })],
  ];
  it.each(strangers)("%s %s cannot point into another project", async (kind, slug, patchOf) => {
    const fault = await faultOf(built, (place) => changePart(place, kind, built.idOf(slug), patchOf(other)));
    expect(fault.reason).toBe("invalid");
  });

  it("the database itself refuses each key into another project", async () => {
    const tried: string[] = [];
    for (const kind of partKinds) {
      for (const { field, to } of partTables[kind].references) {
        const row = await partTables[kind].model.findOne({ where: { projectId: built.project.id, [field]: { [Op.ne]: null } } });
        const list = partTables[to].list!;
        const stranger = other.plan[list][0];
        if (!row || !stranger) continue;
        const written = partTables[kind].model.update({ [field]: stranger.id }, { where: { projectId: built.project.id, id: row.get("id") as string }, fields: [field] });
        await expect(written, `${kind}.${field}`).rejects.toMatchObject({ original: { code: "23503" } });
        tried.push(`${kind}.${field}`);
      }
    }
    expect(tried).toEqual(expect.arrayContaining(["space.buildingId", "surface.spaceId", "element.pathId", "element.constructionId", "criterion.receiverId", "outlet.sourceId"]));
    const foreign = { projectId: built.project.id, receiverId: built.plan.receivers[0]!.id, sourceId: other.plan.sources[0]!.id, metres: 1 };
    await expect(ReceiverDistance.create(foreign, { fields: ["projectId", "receiverId", "sourceId", "metres"] })).rejects.toMatchObject({ original: { code: "23503" } });
  });

  it("an id can be a part of one project only", async () => {
    const taken = { projectId: built.project.id, id: other.plan.elements[0]!.id, kind: "element" };
    await expect(Part.create(taken, { fields: ["projectId", "id", "kind"] })).rejects.toMatchObject({ original: { code: "23505" } });
  });
});
