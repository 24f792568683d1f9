"use client";

import type { Standing } from "@/lib/shots/schema-standing";
import { LinkButton } from "../button/link-button";
import { SendDialog } from "./send-dialog";
import { WithdrawDialog } from "./withdraw-dialog";

export interface ReviewActionsProps {
  version: {
    id: string;
    number: number;
    shotCode: string;
    digest: string | null;
    standing: Standing;
    madeById: string;
  };
  viewer: { role: string | null; mayGiveVerdict: boolean; maySend: boolean; mayWithdraw: boolean };
}

const sealed: readonly Standing[] = [
  "in review",
  "returned",
  "signed off",
  "delivered",
  "received",
  "refused",
];
const signed: readonly Standing[] = ["in review", "signed off", "delivered", "received", "refused"];

/** What the reader can do about a version's review: send it, judge it, or take a verdict back. Nothing where nothing can be done. */
export function ReviewActions({ version, viewer }: ReviewActionsProps) {
  const { standing, digest } = version;
  const sends = viewer.maySend && standing === "ready" && digest !== null;
  const judges = viewer.mayGiveVerdict && sealed.includes(standing);
  const withdraws = viewer.mayWithdraw && signed.includes(standing);
  if (!sends && !judges && !withdraws) return null;
  return (
    <div className="flex flex-wrap items-center gap-16">
      {sends && <SendDialog version={version} />}
      {judges && (
        <LinkButton
          href={`/versions/${version.id}/verdict`}
          look={standing === "in review" ? "primary" : "plain"}
        >
          Give a verdict
        </LinkButton>
      )}
      {withdraws && <WithdrawDialog version={version} />}
    </div>
  );
}
