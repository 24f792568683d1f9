"use client";

import { useRouter } from "next/navigation";
import { useState } from "react";
import { requestJson } from "../api/request";
import { Button } from "../button/button";
import { TextAction } from "../button/text-action";
import { Dialog, DialogClose } from "../dialog/dialog";
import { Message } from "../message/message";

export interface ConfirmDeleteProps {
  path: string;
  /** The act's words, on the page and in the dialog. */
  word: string;
  /** Whom it concerns, for those who hear the page row by row. */
  about: string;
  title: string;
  description: string;
}

/** A word that ends something, after saying what will follow. */
export function ConfirmDelete({ path, word, about, title, description }: ConfirmDeleteProps) {
  const router = useRouter();
  const [open, setOpen] = useState(false);
  const [busy, setBusy] = useState(false);
  const [refusal, setRefusal] = useState<string>();
  const act = async () => {
    setBusy(true);
    setRefusal(undefined);
    try {
      await requestJson(path, { method: "DELETE" });
      setOpen(false);
    } catch (error) {
      setRefusal(error instanceof Error ? error.message : "Something failed here. Try again.");
    } finally {
      setBusy(false);
      router.refresh();
    }
  };
  const trigger = (
    <TextAction className="whitespace-nowrap">
      {word}
      <span className="sr-only">: {about}</span>
    </TextAction>
  );
  return (
    <Dialog trigger={trigger} open={open} onOpenChange={setOpen} title={title} description={description}>
      {refusal && <Message kind="work">{refusal}</Message>}
      <div className="flex flex-wrap items-center gap-16">
        <Button look="primary" busy={busy} onClick={() => void act()}>
          {word}
        </Button>
        <DialogClose>
          <TextAction className="type-label">Leave it as it is</TextAction>
        </DialogClose>
      </div>
    </Dialog>
  );
}
