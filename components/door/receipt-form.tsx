"use client";

import { useRouter } from "next/navigation";
import { useState } from "react";
import type { DoorPage } from "@/lib/deliveries/schema-pages";
import { requestJson } from "../api/request";
import { Button } from "../button/button";
import { TextAction } from "../button/text-action";
import { TextArea } from "../field/text-area";
import { groupDigest } from "../figure/digest";
import { Figure } from "../figure/figure";
import { Message } from "../message/message";

export interface ReceiptFormProps {
  door: DoorPage;
  files: number;
  isTaken: boolean;
  /** A stopped delivery can be refused, and no longer received. */
  onlyRefuse?: boolean;
}

/** The client's word: one sentence to sign, or what is wrong. */
export function ReceiptForm({ door, files, isTaken, onlyRefuse }: ReceiptFormProps) {
  const [refuses, setRefuses] = useState(false);
  const [words, setWords] = useState("");
  const { sign, busy, fault } = useReceipt(door);
  if (refuses)
    return (
      <form
        noValidate
        className="mt-8 grid gap-16"
        onSubmit={(event) => {
          event.preventDefault();
          void sign("refused", words);
        }}
      >
        <TextArea
          label="What is wrong? The studio reads these words."
          rows={4}
          value={words}
          error={fault?.field === "words" ? fault.message : undefined}
          onChange={(event) => setWords(event.target.value)}
        />
        {fault && fault.field !== "words" && <Message kind="work">{fault.message}</Message>}
        <div className="flex flex-wrap items-center gap-16">
          <Button type="submit" look="primary" size="large" busy={busy}>
            Refuse the delivery
          </Button>
          <TextAction onClick={() => setRefuses(false)}>go back</TextAction>
        </div>
      </form>
    );
  if (onlyRefuse)
    return <TextAction onClick={() => setRefuses(true)}>Tell the studio that something is wrong</TextAction>;
  return (
    <div className="mt-8">
      <p className="type-declaration text-text">
        I, <span className="border-b border-edge bg-raised px-4">{door.reader.name}</span>, have received{" "}
        <Figure>{files}</Figure> files, each as it was signed, under digest{" "}
        <Figure className="text-[0.8em]">{shorten(door.manifestDigest)}</Figure>.
      </p>
      {fault && (
        <Message kind="work" className="mt-16">
          {fault.message}
        </Message>
      )}
      <div className="mt-16 flex flex-wrap items-center gap-16">
        <Button
          look="primary"
          size="large"
          busy={busy}
          missing={isTaken ? undefined : "Take the files and check them first."}
          onClick={() => void sign("received", "")}
        >
          Sign the receipt
        </Button>
        <TextAction onClick={() => setRefuses(true)}>something is wrong</TextAction>
      </div>
    </div>
  );
}

const shorten = (digest: string) => {
  const groups = groupDigest(digest);
  return `${groups[0]} … ${groups.at(-1)}`;
};

type Fault = { message: string; field?: string };

function useReceipt({ id, manifestDigest }: DoorPage) {
  const router = useRouter();
  const [busy, setBusy] = useState(false);
  const [fault, setFault] = useState<Fault>();
  const sign = async (kind: "received" | "refused", words: string) => {
    if (kind === "refused" && words.trim() === "")
      return setFault({ message: "Say what is wrong, so that the studio can mend it.", field: "words" });
    setBusy(true);
    setFault(undefined);
    try {
      await requestJson(`/api/deliveries/${id}/receipt`, { body: { kind, words, manifestDigest } });
      router.refresh();
    } catch (error) {
      setFault(error as Fault);
      setBusy(false);
    }
  };
  return { sign, busy, fault };
}
