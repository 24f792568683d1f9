"use client";

import { useRouter } from "next/navigation";
import { useState } from "react";
import { requestJson } from "../api/request";
import { TextAction } from "../button/text-action";
import { Dialog } from "../dialog/dialog";
import { WordsForm } from "../review/words-form";

/** Asks why a delivery is withdrawn. */
export function WithdrawDelivery({
  id,
  number,
  isPublished,
}: {
  id: string;
  number: number;
  isPublished: boolean;
}) {
  const [open, setOpen] = useState(false);
  const router = useRouter();
  const withdraw = async (words: string) => {
    await requestJson(`/api/deliveries/${id}/withdrawal`, { body: { words } });
    setOpen(false);
    router.refresh();
  };
  return (
    <div className="border-t border-hair pt-12">
      <Dialog
        trigger={<TextAction className="type-label">Withdraw this delivery</TextAction>}
        open={open}
        onOpenChange={setOpen}
        title={`Withdraw delivery ${number}?`}
        description={
          isPublished
            ? "It can no longer be taken, and everyone it was published to is told. What they have taken they have. It cannot be published again."
            : "It was published to nobody. It cannot be published afterwards; its frames stay signed and can be delivered anew."
        }
      >
        <WordsForm
          label="Why is it withdrawn?"
          hint={isPublished ? "The recipients read these words." : undefined}
          act="Withdraw it"
          needed="Say why it is withdrawn."
          onSubmit={withdraw}
        />
      </Dialog>
    </div>
  );
}
