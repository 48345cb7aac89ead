import type { ReactNode } from "react";
import { YardState } from "@/components/state/PlanProvider";

interface Props {
  children: ReactNode;
  params: Promise<{ projectId: string }>;
}

/** State only: each page under it asks for its own right to be read. */
export default async function YardLayout({ children, params }: Props) {
  const { projectId } = await params;
  return <YardState key={projectId}>{children}</YardState>;
}
