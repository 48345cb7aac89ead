import { LinkButton } from "../ui/Button";
import { Outcome } from "./Outcome";

/** Used, replaced and invented links look alike. */
export function DeadLink({ href, again }: { href: string; again: string }) {
  return (
    <Outcome
      kind="error"
      heading="This link does not open anything"
      action={
        <LinkButton look="ink" href={href} className="min-h-12 w-full">
          {again}
        </LinkButton>
      }
    >
      Links work once and not for long. Nothing on your yards has changed.
    </Outcome>
  );
}
