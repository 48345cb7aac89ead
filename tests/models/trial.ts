import { expect } from "vitest";
import { connection } from "../../models/index";
import { PartFault, type Place } from "../../models/parts";
import type { BuiltProject } from "../build";

const undone = new Error("undone");

/** Does something to a project and takes it back. */
export async function trial<T>({ project }: BuiltProject, work: (place: Place) => Promise<T>): Promise<T> {
  let result: T | undefined;
  await connection
    .transaction(async (transaction) => {
      result = await work({ projectId: project.id, transaction });
      throw undone;
    })
    .catch((thrown) => {
      if (thrown !== undone) throw thrown;
    });
  return result as T; // set before it is undone
}

/** The refusal that something meets. */
export async function faultOf(built: BuiltProject, work: (place: Place) => Promise<unknown>): Promise<PartFault> {
  const thrown: unknown = await trial(built, work).catch((fault: unknown) => fault);
  expect(thrown).toBeInstanceOf(PartFault);
  return thrown as PartFault; // expected just above
}
