"use client";

import { useStore } from "jotai";
import { useRouter } from "next/navigation";
import { useEffect } from "react";
import { revisionAtom } from "./plan";

/** A page the browser went back to may be older than what this reader has saved since: it is asked for again. */
export function KeepFresh({ revision }: { revision: number }) {
  const store = useStore();
  const router = useRouter();
  useEffect(() => {
    if (store.get(revisionAtom) > revision) router.refresh();
  }, [store, router, revision]);
  return null;
}
