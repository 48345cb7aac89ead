import type { Metadata } from "next";
import { listDevices } from "@/app/_server/accounts/devices";
import { pageFault } from "@/app/_server/errors";
import { requirePageReader } from "@/app/_server/projectPage";
import { OpenAccount } from "@/components/account/OpenAccount";
import { accountAddress, projectsAddress, signInAddress } from "@/components/addresses";
import { Header } from "@/components/frame/Header";
import { Page } from "@/components/frame/Page";

export const dynamic = "force-dynamic";
export const metadata: Metadata = { title: "Your account" };

export default async function AccountPage() {
  const reader = await requirePageReader(signInAddress(accountAddress));
  const devices = await listDevices(reader).catch((thrown: unknown) => Promise.reject(pageFault(thrown)));
  const { name, email, theme, figures } = reader;
  return (
    <>
      <Header theme={theme === "system" ? undefined : theme} user={{ name, email }} home={projectsAddress} skipTo="#account" skipWords="Skip to your account" />
      <Page>
        <OpenAccount
          facts={{ name, email, theme, units: figures.units, decimalMark: figures.mark }}
          devices={devices.map(({ beganAt, seenAt, ...device }) => ({ ...device, beganAt: beganAt.toISOString(), seenAt: seenAt.toISOString() }))}
          now={new Date().toISOString()}
        />
      </Page>
    </>
  );
}
