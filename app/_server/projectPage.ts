import "server-only";
import { cookies } from "next/headers";
import { notFound, redirect } from "next/navigation";
import { cache } from "react";
import type { Project } from "@/models";
import { rightOf, type Role } from "./access";
import { cookieName } from "./cookies";
import { pageFault, Refusal } from "./errors";
import { identify, type Reader } from "./identity";
import { openProject, peopleOf, prepareAnswer, refusalWords, type Person } from "./projects";
import { inOneMoment } from "./transactions";
import type { Answer } from "./weigh";

export interface ProjectFacts {
  id: string;
  name: string;
  says: string;
  stage: string;
  timeZone: string;
  currency: string;
  archived: boolean;
}

export interface OpenedPage {
  user: { name: string; email: string; theme: Reader["theme"]; figures: Reader["figures"] };
  project: ProjectFacts;
  people: Person[];
  may: { edit: boolean; reason: string };
  /** Every role the reader has here. */
  roles: readonly Role[];
  answer: Answer;
}

/** The reader of a page. One look-up per request, however often it is asked. */
export const readerOfPage = cache(async (): Promise<Reader | undefined> => {
  const seal = (await cookies()).get(cookieName())?.value;
  return identify(seal).catch((thrown: unknown) => Promise.reject(pageFault(thrown)));
});

export async function requirePageReader(signIn: string): Promise<Reader> {
  return (await readerOfPage()) ?? redirect(signIn);
}

/**
 * A page of a project. Whoever is not signed in goes to `signIn`, the sign-in page's address with the way back; whoever
 * has no right finds nothing.
 */
export async function openProjectPage(projectId: string, signIn: string): Promise<OpenedPage> {
  const reader = await requirePageReader(signIn);
  try {
    return await pageOf(reader, projectId);
  } catch (thrown) {
    if (thrown instanceof Refusal && thrown.code === "missing") notFound();
    throw pageFault(thrown);
  }
}

async function pageOf(reader: Reader, projectId: string): Promise<OpenedPage> {
  const { opened, people, reason, finish } = await inOneMoment(async (transaction) => {
    const opened = await openProject({ reader, projectId, act: "open project", transaction });
    const people = await peopleOf(opened.project, reader, transaction);
    const reason = await refusalWords(opened.project, reader, transaction);
    return { opened, people, reason, finish: await prepareAnswer(opened.project, transaction) };
  });
  const edit = rightOf(opened.roles, "edit plan")?.right === "may" && !opened.project.archivedAt;
  return {
    user: { name: reader.name, email: reader.email, theme: reader.theme, figures: reader.figures },
    project: facts(opened.project),
    people,
    roles: opened.roles,
    may: { edit, reason: edit ? "" : opened.project.archivedAt ? "This yard is archived." : reason },
    answer: finish(),
  };
}

export function facts({ id, name, says, stage, timeZone, currency, archivedAt }: Project): ProjectFacts {
  return { id, name, says, stage, timeZone, currency, archived: archivedAt !== null };
}
