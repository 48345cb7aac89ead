import type { ReactNode } from "react";
import { Header } from "../frame/Header";
import { Page } from "../frame/Page";
import type { LandingBuild } from "../landing/LandingBuild";
import { EntrySheet } from "./EntrySheet";

interface Props {
  heading: string;
  /** The example that is drawn beside the form. */
  example: LandingBuild;
  children: ReactNode;
  /** Other ways on, under the form. */
  links?: ReactNode;
}

/** Every page before the sign-in: nothing of a yard shows on it but the example. */
export function EntryPage(props: Props) {
  return (
    <>
      <Header skipTo="#entry" skipWords="Skip to the form" />
      <Page>
        <EntrySheet {...props} />
      </Page>
    </>
  );
}
