import { creatingRoute } from "@/app/_server/creatingRoute";
import { newProject } from "@/app/_server/newProject";
import { yardAddress } from "@/components/addresses";

export const POST = creatingRoute<object>(newProject, yardAddress);
