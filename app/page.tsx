import { redirect } from "next/navigation";
import { projectsAddress, signInAddress } from "@/components/addresses";
import { readerOfPage } from "./_server/projectPage";

export const dynamic = "force-dynamic";

export default async function HomePage() {
  redirect((await readerOfPage()) ? projectsAddress : signInAddress());
}
