import { Icon } from "../marks/Icon";
import { Button } from "../ui/Button";
import { Sheet } from "../ui/Sheet";

interface Props {
  mayEdit: boolean;
  reason: string;
  adding: boolean;
  onAdd: () => void;
}

/** Before the first room: the shape of the answer and the next step. */
export function EmptyRooms({ mayEdit, reason, adding, onAdd }: Props) {
  return (
    <>
      <h1 className="mb-4 text-verdictPhone leading-[1.12] mid:mb-5 desk:text-verdict">Rooms</h1>
      <Sheet heading="No room yet" className="mb-5">
        <svg width="240" height="150" viewBox="0 0 240 150" role="img" aria-label="Two rooms side by side, not drawn yet" className="mb-4 block max-w-full">
          <path d="M10 10h220v130H10zM150 10v130" fill="none" strokeWidth="2" strokeDasharray="8 6" className="stroke-edge" />
        </svg>
        <p className="mb-4 max-w-prose text-ink2">
          Start with the room you play in, then the bedroom next door. Paced out is good enough: width, depth, height, and whether it is bare, furnished or treated.
        </p>
        {mayEdit ? (
          !adding && (
            <Button look="ink" icon={<Icon name="plus" size={18} />} onClick={onAdd}>
              Add the first room
            </Button>
          )
        ) : (
          <p className="flex items-center gap-2 text-second text-ink2">
            <Icon name="lock" size={18} />
            {reason}
          </p>
        )}
      </Sheet>
    </>
  );
}
