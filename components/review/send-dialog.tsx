"use client";

import { useRouter } from "next/navigation";
import { useState } from "react";
import { requestJson } from "../api/request";
import { Button } from "../button/button";
import { Dialog } from "../dialog/dialog";
import { WordsForm } from "./words-form";

/** Asks for the words that go to the advisor with a version. */
export function SendDialog({ version }: { version: { id: string; number: number; shotCode: string } }) {
  const [open, setOpen] = useState(false);
  const router = useRouter();
  const send = async (words: string) => {
    await requestJson(`/api/versions/${version.id}/submission`, { body: { words } });
    setOpen(false);
    router.refresh();
  };
  return (
    <Dialog
      trigger={<Button look="primary">Send for review</Button>}
      open={open}
      onOpenChange={setOpen}
      title={`Send version ${version.number} of ${version.shotCode} to the science advisor?`}
      description="It is sent once, as it is. The advisor is told by letter, and it waits in their queue until it is signed off or returned."
    >
      <WordsForm
        label="What should the advisor look at?"
        act="Send it for review"
        needed="Say what the advisor should look at."
        onSubmit={send}
      />
    </Dialog>
  );
}
