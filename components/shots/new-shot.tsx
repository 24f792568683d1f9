"use client";

import dynamic from "next/dynamic";
import { useState } from "react";
import type { ShotList } from "@/lib/shots/schema";
import { Button } from "../button/button";
import { Dialog } from "../dialog/dialog";
import { Loading } from "../empty/loading";

const NewShotForm = dynamic(() => import("./new-shot-form").then((form) => form.NewShotForm), {
  loading: () => <Loading what="the form" />,
});

/** Adds a shot, with a setup at its defaults to begin from. */
export function NewShot({ list }: { list: ShotList }) {
  const [open, setOpen] = useState(false);
  return (
    <Dialog trigger={<Button>New shot</Button>} open={open} onOpenChange={setOpen} title="New shot">
      <NewShotForm list={list} onDone={() => setOpen(false)} />
    </Dialog>
  );
}
