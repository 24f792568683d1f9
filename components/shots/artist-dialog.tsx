"use client";

import { useState, type FormEvent } from "react";
import type { ShotChange, ShotLine, ShotList } from "@/lib/shots/schema";
import { Button } from "../button/button";
import { TextAction } from "../button/text-action";
import { Dialog, DialogClose } from "../dialog/dialog";
import { Choice } from "../field/choice";
import { Message } from "../message/message";

export interface ArtistDialogProps {
  shots: ShotLine[];
  artists: ShotList["artists"];
  onChange: (change: ShotChange) => Promise<void>;
}

const nobody = "nobody";

/** Asks which artist gets the chosen shots. */
export function ArtistDialog({ shots, artists, onChange }: ArtistDialogProps) {
  const [open, setOpen] = useState(false);
  const [artist, setArtist] = useState(artists[0]?.id ?? nobody);
  const [refusal, setRefusal] = useState<string>();
  const submit = async (event: FormEvent) => {
    event.preventDefault();
    try {
      await onChange({ what: "artist", artist: artist === nobody ? null : artist });
      setOpen(false);
    } catch (error) {
      setRefusal((error as Error).message);
    }
  };
  const which = shots.length === 1 ? shots[0]?.code : `these ${shots.length} shots`;
  return (
    <Dialog
      trigger={<TextAction>give {shots.length === 1 ? "it" : "them"} to someone</TextAction>}
      open={open}
      onOpenChange={setOpen}
      title={`Who takes ${which}?`}
    >
      <form onSubmit={(event) => void submit(event)} className="grid gap-16">
        <Choice
          legend="Artist"
          hideLegend
          value={artist}
          onChange={(event) => setArtist(event.target.value)}
          options={[
            ...artists.map(({ id, name }) => ({ value: id, word: name })),
            { value: nobody, word: "Nobody for now" },
          ]}
        />
        {refusal && <Message kind="work">{refusal}</Message>}
        <div className="flex flex-wrap items-center gap-16">
          <Button type="submit" look="primary">
            Give {shots.length === 1 ? "it" : "them"}
          </Button>
          <DialogClose>
            <TextAction>Leave it</TextAction>
          </DialogClose>
        </div>
      </form>
    </Dialog>
  );
}
