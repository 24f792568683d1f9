"use client";

import { useRouter } from "next/navigation";
import { useRef, useState } from "react";
import type { DeclarationFacts } from "@/lib/reviews/schema-pages";
import { requestJson } from "../api/request";
import { TextAction } from "../button/text-action";
import { Dialog } from "../dialog/dialog";
import { WordsForm } from "./words-form";

/** Asks why a sign-off is taken back, and says what that stops. */
export function WithdrawDialog({ version }: { version: { id: string; number: number; shotCode: string } }) {
  const [open, setOpen] = useState(false);
  const router = useRouter();
  const path = `/api/versions/${version.id}/verdicts`;
  // The newest verdict as it was when the reader began: of two who act at once, one is told of the other.
  const seen = useRef<Promise<DeclarationFacts>>(undefined);
  const change = (next: boolean) => {
    if (next) seen.current = requestJson<DeclarationFacts>(path);
    seen.current?.catch(() => undefined);
    setOpen(next);
  };
  const withdraw = async (words: string) => {
    const after = (await seen.current)?.after ?? null;
    await requestJson(`${path}/withdrawal`, { body: { words, after } });
    setOpen(false);
    router.refresh();
  };
  return (
    <Dialog
      trigger={<TextAction>Withdraw the verdict</TextAction>}
      open={open}
      onOpenChange={change}
      title={`Withdraw the sign-off of version ${version.number} of ${version.shotCode}?`}
      description="Every frame of it that is signed off will no longer be. Downloads of deliveries that hold them stop at once, and everyone they were published to is told. The verdict stays in the log."
    >
      <WordsForm
        label="Why is it withdrawn?"
        hint="The recipients read these words, too."
        act="Withdraw the sign-off"
        needed="Say why; everyone who was sent the frames reads it."
        onSubmit={withdraw}
      />
    </Dialog>
  );
}
