import { projectRead, projectRoute } from "@/app/_server/projectRoute";
import { prepareAnswer } from "@/app/_server/projects";
import { changeProject } from "@/app/_server/changeProject";

type Params = { projectId: string };

export const GET = projectRead<Params>("open project", ({ opened: { project }, transaction }) => prepareAnswer(project, transaction));

export const PATCH = projectRoute<Params>("rename project", changeProject);
