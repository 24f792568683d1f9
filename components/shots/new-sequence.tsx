"use client";

import dynamic from "next/dynamic";
import { useState } from "react";
import { TextAction } from "../button/text-action";
import { Dialog } from "../dialog/dialog";
import { Loading } from "../empty/loading";

const NewSequenceForm = dynamic(() => import("./new-sequence-form").then((form) => form.NewSequenceForm), {
  loading: () => <Loading what="the form" />,
});

/** Adds a sequence after the last. */
export function NewSequence({ production }: { production: { id: string; name: string } }) {
  const [open, setOpen] = useState(false);
  return (
    <Dialog
      trigger={<TextAction className="type-label">New sequence</TextAction>}
      open={open}
      onOpenChange={setOpen}
      title="New sequence"
      description={`It is added after the last sequence of ${production.name}.`}
    >
      <NewSequenceForm production={production.id} onDone={() => setOpen(false)} />
    </Dialog>
  );
}
