"use client";

import { useRouter } from "next/navigation";
import type { ComponentProps } from "react";
import { AccountPage } from "./AccountPage";

/** The account within the running site, which can ask for the page anew. */
export function OpenAccount(props: Omit<ComponentProps<typeof AccountPage>, "onChanged">) {
  const router = useRouter();
  return <AccountPage {...props} onChanged={() => router.refresh()} />;
}
