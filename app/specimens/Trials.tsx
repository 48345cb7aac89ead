"use client";

import { useState } from "react";
import { Icon } from "@/components/marks/Icon";
import { Button } from "@/components/ui/Button";
import { Checkbox } from "@/components/ui/Checkbox";
import { Dialog } from "@/components/ui/Dialog";
import { NumberField } from "@/components/ui/NumberField";
import { Select } from "@/components/ui/Select";
import { TextField } from "@/components/ui/TextField";
import { useWidthClass } from "@/components/ui/useWidthClass";

export function FieldTrials() {
  const [gap, setGap] = useState<number | null>(25);
  const [mass, setMass] = useState<number | null>(null);
  return (
    <div className="grid gap-4 mid:grid-cols-2 desk:grid-cols-3">
      <NumberField
        label="Gap between the studs"
        unit="mm"
        value={gap}
        min={0}
        max={1000}
        onCommit={setGap}
        caution={(value) => (value >= 250 ? `Ten times the usual gap. Did you mean ${value / 10} mm?` : undefined)}
        hint={`Stored: ${gap ?? "not known"}`}
      />
      <NumberField label="Surface mass" unit="kg/m²" value={mass} step={0.1} min={0.01} max={2000} optional onCommit={setMass} hint="Empty means not known." />
      <NumberField label="Refused by the server" unit="dB" value={131} onCommit={() => undefined} error="Louder than anything we have read of. 120 dB at most." />
      <TextField label="Name" defaultValue="East wall of the live room" />
      <TextField label="Name, missing" error="A yard needs a name." />
      <Select
        label="Seal"
        defaultValue="perimeter"
        choices={[
          { value: "none", label: "None" },
          { value: "perimeter", label: "All round" },
          { value: "drop", label: "All round, with a drop seal" },
        ]}
      />
      <Checkbox label="Gap kept clear" defaultChecked />
    </div>
  );
}

export function DialogTrial() {
  const [open, setOpen] = useState(false);
  const close = () => setOpen(false);
  return (
    <>
      <Button onClick={() => setOpen(true)}>Delete the layer</Button>
      <Dialog
        open={open}
        heading="Delete layer 5?"
        onClose={close}
        actions={
          <>
            <Button look="ink" onClick={close}>
              Delete it
            </Button>
            <Button onClick={close}>Keep it</Button>
          </>
        }
      >
        The two leaves would then touch. You can undo this.
      </Dialog>
    </>
  );
}

export function ButtonTrials() {
  return (
    <div className="flex flex-wrap items-start gap-3">
      <Button look="ink" icon={<Icon name="weigh" />}>
        Weigh again
      </Button>
      <Button look="lamp">Try a heavier door</Button>
      <Button>Copy it</Button>
      <Button look="square" aria-label="Use night colours" icon={<Icon name="moon" />} />
      <div>
        <Button look="ink" reason="Two photos are missing.">
          Sign this stop
        </Button>
      </div>
    </div>
  );
}

export function WidthTrial() {
  return <p>Charts are drawn for {useWidthClass()} pixels.</p>;
}
