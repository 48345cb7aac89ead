import { ExampleCut } from "./ExampleCut";
import { SignInForm } from "./SignInForm";

interface Props {
  next?: string;
  notice?: string;
  /** Whole decibels of the example at the kit, by the door, at the fence, at the wall and in bed. */
  levels?: readonly number[];
}

/** The form beside the example; nothing of a yard shows before sign-in. On the phone the form comes first. */
export function SignInPage({ next, notice, levels }: Props) {
  return (
    <div className="grid overflow-hidden rounded-sheet desk:grid-cols-[minmax(0,1.1fr)_minmax(0,1fr)] wide:grid-cols-[minmax(0,1.45fr)_minmax(0,1fr)]">
      <section className="bg-sheet p-4 mid:p-8 desk:order-2 wide:px-10 wide:py-9" aria-labelledby="sign-in">
        <h1 id="sign-in" tabIndex={-1} className="mb-4 text-head mid:text-verdictDesk">
          Sign in
        </h1>
        <SignInForm next={next} notice={notice} />
      </section>
      <section className="on-slab flex flex-col justify-between gap-6 p-4 max-desk:mt-3 max-desk:rounded-sheet mid:p-7 desk:order-1 wide:p-9" aria-label="An example">
        <div>
          <p className="text-second text-ink2">{levels ? "An invented yard, levels in dB" : "An invented yard, cut open to scale"}</p>
          <p className="figure mt-1 text-section font-[620] mid:text-head">Weigh it before you build it.</p>
        </div>
        <ExampleCut levels={levels} />
      </section>
    </div>
  );
}
