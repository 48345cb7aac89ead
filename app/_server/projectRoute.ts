import "server-only";
import { fn, type Transaction } from "sequelize";
import { countPairs, MOST_PAIRS } from "@/lib/noise/sound/pairs";
import { Project, Revision, User, type Act } from "@/models";
import { advancePlan, readPlan, type StoredPlan } from "@/models/parts";
import type { ActName } from "./access";
import { answer, jsonAnswer, renewed, requireReader } from "./answer";
import { Refusal } from "./errors";
import { once } from "./idempotency";
import type { Reader } from "./identity";
import { openProject, prepareAnswer, type Opened } from "./projects";
import { readBody, readRevision, requireSameOrigin } from "./request";
import { inOneMoment, inTransaction } from "./transactions";
import { keptAnswer, keptPlan, weigh, type Answer } from "./weigh";

type Ids = { projectId: string };
type Route<P> = (request: Request, context: { params: Promise<P> }) => Promise<Response>;
type ActOf<P> = ActName | ((params: P) => ActName);

const actOf = <P>(act: ActOf<P>, params: P): ActName => (typeof act === "function" ? act(params) : act);

interface Reading<P> {
  params: P;
  opened: Opened;
  transaction: Transaction;
}

/** A route that reads a project. `read` gathers inside the transaction and gives what makes the answer outside it. */
export function projectRead<P extends Ids>(act: ActOf<P>, read: (given: Reading<P>) => Promise<() => object>): Route<P> {
  return (request, context) =>
    answer(async () => {
      const reader = await requireReader(request);
      const params = await context.params;
      const finish = await inOneMoment(async (transaction) => {
        const opened = await openProject({ reader, projectId: params.projectId, act: actOf(act, params), transaction });
        return read({ params, opened, transaction });
      });
      return renewed(jsonAnswer(finish()), reader);
    });
}

interface Change<P> {
  params: P;
  projectId: string;
  project: Project;
  body: Record<string, unknown>;
  transaction: Transaction;
}

/**
 * A route that changes a plan. `change` does it and gives the touched parts; around it stand origin, identity, right, the
 * revision it was made on, the project's lock, the record of the change, and the answer with the plan weighed anew.
 */
export function projectRoute<P extends Ids>(act: ActOf<P>, change: (given: Change<P>) => Promise<Act[]>): Route<P> {
  return (request, context) =>
    answer(async () => {
      requireSameOrigin(request);
      const reader = await requireReader(request);
      const params = await context.params;
      const body = request.method === "DELETE" ? {} : await readBody(request);
      const made = { request, reader, params, body, act: actOf(act, params), made: readRevision(request) };
      try {
        const { project, revision, stored } = await inTransaction((transaction) =>
          changed({ ...made, transaction }, (project) =>
            change({ params, projectId: params.projectId, project, body, transaction }),
          ),
        );
        const answered = stored ? weigh(project.id, revision, stored) : await answerAgain(project, revision);
        return await renewed(jsonAnswer(answered), reader);
      } catch (thrown) {
        if (thrown instanceof Stale) return await staleAnswer(thrown);
        throw thrown;
      }
    });
}

interface Making {
  request: Request;
  reader: Reader;
  params: Ids;
  body: Record<string, unknown>;
  act: ActName;
  made: number | undefined;
  transaction: Transaction;
}

/** The revision a request came to, and the plan as it then stands unless the request is one that was done before. */
async function changed(making: Making, change: (project: Project) => Promise<Act[]>) {
  const { reader, params, act, transaction } = making;
  const { project, role } = await openProject({ reader, projectId: params.projectId, act, transaction });
  let stored: StoredPlan | undefined;
  // Before the revision is looked at: a request that was done and comes again is late by its own doing.
  const { revision } = await once(making, async () => {
    stored = await changeNow(making, { project, role }, change);
    return { revision: project.revision };
  });
  return { project, revision, stored };
}

async function changeNow({ reader, made, transaction }: Making, { project, role }: Pick<Opened, "project" | "role">, change: (project: Project) => Promise<Act[]>): Promise<StoredPlan> {
  const { id } = project;
  if (made === undefined) throw new Refusal("revision needed", "Say which revision this change was made on (If-Match).");
  // Who is late is told before anybody waits for the lock.
  if (project.revision !== made) throw new Stale(id, made);
  await project.reload({ lock: transaction.LOCK.UPDATE, transaction });
  if (project.revision !== made) throw new Stale(id, made);
  const acts = await change(project);
  const plan = keptPlan(id, made);
  if (acts.length) await record({ project, acts, reader, role, transaction });
  // Under the lock the plan of the revision before is the rows as they stood: no need to read them all again.
  const stored = plan ? { plan: advancePlan(plan, acts), damage: [] } : await readPlan(id, transaction);
  if (acts.some(({ act }) => act !== "remove")) refuseTooMany(countPairs(stored.plan));
  return stored;
}

/** What a request that was done before was answered; where memory no longer holds that, the yard as it stands now. */
async function answerAgain({ id }: Project, revision: number): Promise<Answer> {
  const kept = keptAnswer(id, revision);
  if (kept) return kept;
  const finish = await inOneMoment(async (transaction) => {
    const project = await Project.findOne({ where: { id }, rejectOnEmpty: true, transaction });
    return prepareAnswer(project, transaction);
  });
  return finish();
}

/** The bound on the work of one verdict. What only takes away is never refused. */
function refuseTooMany(pairs: number) {
  if (pairs <= MOST_PAIRS) return;
  const words = "This would be more ways from wall to wall through the yard than we can weigh";
  throw new Refusal("conflict", `${words}: ${pairs} of at most ${MOST_PAIRS}. Join small elements of one wall, or take some away first.`);
}

interface Recording {
  project: Project;
  acts: Act[];
  reader: Reader;
  role: string;
  transaction: Transaction;
}

async function record({ project, acts, reader, role, transaction }: Recording) {
  const revision = project.revision + 1;
  const row = { projectId: project.id, revision, userId: reader.id, role, acts };
  await Revision.create(row, { fields: ["projectId", "revision", "userId", "role", "acts"], transaction });
  const changedAt = fn("now") as unknown as Date; // the database's time
  await project.update({ revision, changedAt }, { fields: ["revision", "changedAt"], transaction });
}

/** Somebody changed the plan since the revision this change was made on. */
class Stale extends Error {
  constructor(
    readonly projectId: string,
    readonly made: number,
  ) {
    super("stale");
  }
}

/** 409 with the plan as it stands now, who changed it, and which parts they touched. */
async function staleAnswer({ projectId, made }: Stale): Promise<Response> {
  const { project, finish, since } = await inOneMoment(async (transaction) => {
    const project = await Project.findOne({ where: { id: projectId }, rejectOnEmpty: true, transaction });
    return { project, finish: await prepareAnswer(project, transaction), since: await revisionsSince(projectId, made, transaction) };
  });
  const last = since.at(-1);
  const name = last?.user?.name ?? "Somebody";
  const changedBy = { name, at: last?.at ?? project.changedAt, whole: since.length === project.revision - made, parts: since.flatMap(({ acts }) => acts) };
  const more = { current: finish(), changedBy };
  const refusal = new Refusal("conflict", `${name} changed this yard in the meantime.`, { more });
  return answer(() => Promise.reject(refusal));
}

/** At most a hundred changes: who is further behind sees the plan as a whole. */
async function revisionsSince(projectId: string, made: number, transaction: Transaction) {
  const rows = await Revision.findAll({
    where: { projectId },
    include: [{ model: User, as: "user", attributes: ["name"] }],
    order: [["revision", "DESC"]],
    limit: 100,
    transaction,
  });
  // Read with the user above.
  const named = rows as (Revision & { user: { name: string } | null })[];
  return named.filter(({ revision }) => revision > made).reverse();
}
