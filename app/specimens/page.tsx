import type { Metadata } from "next";
import { cookies } from "next/headers";
import { notFound } from "next/navigation";
import { bandWords, pathKindWords } from "@/components/format";
import { Beam } from "@/components/frame/Beam";
import { Header } from "@/components/frame/Header";
import { Page } from "@/components/frame/Page";
import { PhoneBar } from "@/components/frame/PhoneBar";
import { readTheme, THEME_COOKIE } from "@/components/frame/theme";
import { BasisMark } from "@/components/marks/BasisMark";
import { HatchDefs, hatchFill } from "@/components/marks/HatchDefs";
import { HatchSwatch } from "@/components/marks/HatchSwatch";
import { STACK_ORDER } from "@/components/marks/hatches";
import { Icon } from "@/components/marks/Icon";
import { MarginWords } from "@/components/marks/MarginWords";
import { SmallBeam } from "@/components/marks/SmallBeam";
import { EmptyYards } from "@/components/projects/EmptyYards";
import { ProjectList } from "@/components/projects/ProjectList";
import { readYardView } from "@/components/projects/yardView";
import { EntrySheet } from "@/components/signIn/EntrySheet";
import { SignInForm } from "@/components/signIn/SignInForm";
import { Button, LinkButton } from "@/components/ui/Button";
import { Disclosure } from "@/components/ui/Disclosure";
import { Sheet } from "@/components/ui/Sheet";
import { Strip } from "@/components/ui/Strip";
import { Cell, HeadCell, Row, RowHead, Table } from "@/components/ui/Table";
import { Tag } from "@/components/ui/Tag";
import { exampleBuild } from "../exampleBuild";
import { iconNames, margins, projects } from "./samples";
import { ButtonTrials, DialogTrial, FieldTrials, WidthTrial } from "./Trials";

export const metadata: Metadata = { title: "Marks and states" };

const stages = [
  { href: "/specimens", label: "Walls & openings", short: "Walls", current: true },
  { href: "/specimens?stage=budget", label: "Budget", missing: true },
];

function Marks() {
  return (
    <Sheet heading="Where the bead sits against the line" says="each notch is 1 dB, the pivot is the limit, the pale band is the doubt">
      <div className="grid gap-6 mid:grid-cols-2 desk:grid-cols-3">
        {margins.map(({ says, ...margin }) => (
          <div key={says}>
            <SmallBeam {...margin} />
            <MarginWords {...margin} />
            <p className="text-second text-ink2">{says}</p>
          </div>
        ))}
      </div>
    </Sheet>
  );
}

function Hatches() {
  return (
    <Sheet heading="One hatch for each kind of path">
      <div className="grid grid-cols-2 gap-5 mid:grid-cols-5">
        {STACK_ORDER.map((kind) => (
          <div key={kind}>
            <HatchSwatch kind={kind} width={104} height={44} />
            <p className="mb-2 text-second font-semibold">{pathKindWords[kind]}</p>
            <HatchSwatch kind={kind} lit width={104} height={44} />
            <p className="text-second text-ink2">lit</p>
          </div>
        ))}
      </div>
      <svg width="300" height="60" role="img" aria-label="Hatches in a shape that is no rectangle" className="mt-4 block max-w-full stroke-ink">
        <path d="M10 50 60 8h60l30 42z" fill={hatchFill("roof")} />
        <path d="M160 50 210 8h60l20 42z" fill={hatchFill("outdoor unit", true)} />
      </svg>
    </Sheet>
  );
}

function Strips() {
  return (
    <div className="grid gap-3 desk:grid-cols-2">
      <Strip kind="stale" heading="Changed since 21:04: door seal, 2 limits" action={<Button look="ink">Weigh again</Button>}>
        Figures below are from before.
      </Strip>
      <Strip kind="error" heading="The fan has no sound level at 63 Hz" action={<Button>Open the fan</Button>}>
        Nothing is lost. Give it a figure, or take the typical one and mark it so.
      </Strip>
      <Strip kind="offline" heading="No signal">
        2 photos are kept on this phone and will go up later.
      </Strip>
      <Strip kind="undo" heading="Layer 5 deleted" action={<Button>Undo</Button>} />
      <Strip kind="wait" heading="Wait a little">
        The next try in 11 seconds.
      </Strip>
      <Strip kind="stop" heading="Keep layer 5 empty">
        One stray screw across the gap ties the two leaves together.
      </Strip>
    </div>
  );
}

function Figures() {
  return (
    <Table>
      <thead>
        <tr>
          <HeadCell>Path</HeadCell>
          <HeadCell figures>alone</HeadCell>
          <HeadCell figures>share</HeadCell>
        </tr>
      </thead>
      <tbody>
        {(["roof", "door", "wall"] as const).map((kind, index) => (
          <Row key={kind} lit={kind === "door"}>
            <RowHead>
              <span className="flex items-center gap-3">
                <HatchSwatch kind={kind} lit={kind === "door"} />
                {pathKindWords[kind]}
              </span>
            </RowHead>
            <Cell figures>{48 - index} dB</Cell>
            <Cell figures>{42 - 5 * index} %</Cell>
          </Row>
        ))}
      </tbody>
    </Table>
  );
}

export default async function SpecimensPage() {
  if (process.env.NODE_ENV === "production") notFound();
  const theme = readTheme((await cookies()).get(THEME_COOKIE)?.value);
  return (
    <>
      <Header
        theme={theme}
        user={{ name: "Ines Example", email: "ines@yard.example" }}
        crumb={{ name: "Lot 7, an invented row", says: "as drawn" }}
        note="Weighed today 21:04"
        action={<Button look="ink" icon={<Icon name="weigh" />}>Weigh again</Button>}
      >
        <Beam stages={stages} />
      </Header>
      <HatchDefs />
      <Page bar className="flex flex-col gap-5">
        <h1 id="verdict" tabIndex={-1} className="text-verdictPhone mid:text-verdict">
          Marks and states
        </h1>
        <Marks />
        <Hatches />
        <Sheet heading="Buttons">
          <ButtonTrials />
        </Sheet>
        <section className="on-slab flex flex-wrap gap-3 rounded-sheet p-6.5" aria-label="On the night slab">
          <LinkButton look="lamp" href="/specimens">Try a heavier door</LinkButton>
          <LinkButton href="/specimens">How sure is this?</LinkButton>
          <MarginWords state="over" margin={-2.8} />
        </section>
        <Sheet heading="Fields">
          <FieldTrials />
        </Sheet>
        <Sheet heading="Strips">
          <Strips />
        </Sheet>
        <div className="grid gap-5 desk:grid-cols-2">
          <Sheet heading={`${bandWords(63)}, weighed`} beside={<MarginWords state="over">1.9 times</MarginWords>}>
            <Figures />
          </Sheet>
          <Sheet heading="Small parts">
            <div className="flex flex-col items-start gap-3">
              <Tag dashed icon={<Icon name="note" size={16} />}>Changed since: door seal, 2 limits</Tag>
              <Tag icon={<Icon name="tick" size={16} />}>here</Tag>
              <BasisMark basis="measured" doubt={1.5} />
              <BasisMark basis="laboratory" doubt={2} />
              <BasisMark basis="calculated" doubt={4} />
              <BasisMark basis="estimated" doubt={7} />
              <BasisMark basis="unknown" />
              <Disclosure summary="How sure is this?">What is measured, calculated and estimated, the largest doubt first.</Disclosure>
              <DialogTrial />
              <WidthTrial />
            </div>
          </Sheet>
        </div>
        <Sheet heading="Icons">
          <div className="flex flex-wrap gap-5">
            {iconNames.map((name) => (
              <span key={name} className="flex items-center gap-2 text-second">
                <Icon name={name} />
                {name}
              </span>
            ))}
          </div>
        </Sheet>
        <EntrySheet heading="Sign in" example={exampleBuild()}>
          <SignInForm notice="This address is not encrypted. Use it only in your own network." />
        </EntrySheet>
        <ProjectList
          projects={projects}
          now="2027-01-14T21:30:00Z"
          timeZone="Europe/Berlin"
          view={readYardView(() => null)}
          facts={{ page: 1, pages: 1, found: 4, inUse: 4, archived: 0, paged: false }}
          mayMake
        />
        <EmptyYards actions={<Button look="ink">Draw the fence</Button>} />
      </Page>
      <PhoneBar stages={stages} />
    </>
  );
}
