export interface RoomChoiceProps {
  /** The room that pages of this kind are drawn in unless the reader says otherwise. */
  native: "desk" | "viewing";
  /** The room this page is drawn in now. */
  room: "desk" | "viewing";
  /** Takes the form's `native` and turns pages of that kind the other way about. */
  onChoose: (form: FormData) => Promise<void>;
}

/** The reader's choice between paper and neutral grey. A form, so that it works before any script has arrived. */
export function RoomChoice({ native, room, onChoose }: RoomChoiceProps) {
  return (
    <form action={onChoose}>
      <input type="hidden" name="native" value={native} />
      <button type="submit" className="action cursor-pointer text-soft">
        Read <span className="max-sm:sr-only">this page</span> {room === "desk" ? "dark" : "light"}
      </button>
    </form>
  );
}
