import type { Metadata } from "next";
import { finishLibrary } from "@/app/_server/library";
import { openProjectPage } from "@/app/_server/projectPage";
import { roomsAddress, signInAddress } from "@/components/addresses";
import { YardFrame } from "@/components/frame/YardFrame";
import { RoomsDesk } from "@/components/rooms/RoomsDesk";

export const dynamic = "force-dynamic";
export const metadata: Metadata = { title: "Rooms" };

interface Props {
  params: Promise<{ projectId: string }>;
  searchParams: Promise<{ room?: string | string[] }>;
}

export default async function RoomsPage({ params, searchParams }: Props) {
  const { projectId } = await params;
  const { room } = await searchParams;
  const { user, project, may, answer } = await openProjectPage(projectId, signInAddress(roomsAddress(projectId)));
  return (
    <YardFrame project={project} user={user} stage="rooms" revision={answer.revision}>
      <RoomsDesk projectId={projectId} opened={typeof room === "string" ? room : undefined} answer={answer} finishes={finishLibrary()} may={may} />
    </YardFrame>
  );
}
