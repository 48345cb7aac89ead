import { copyProject } from "@/app/_server/copyProject";
import { creatingRoute } from "@/app/_server/creatingRoute";
import { budgetAddress } from "@/components/addresses";

export const POST = creatingRoute<{ projectId: string }>(copyProject, budgetAddress);
