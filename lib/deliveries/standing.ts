import type { Standing } from "../shots/schema-standing";
import type { ReceiptKind } from "@/db/enums";

export interface DeliveryFacts {
  withdrawn: boolean;
  published: boolean;
  stopped: boolean;
  receipts: ReceiptKind[];
  recipients: number;
}

/** How a delivery stands, in the words of the rings; a withdrawn one has none. */
export function deliveryStanding(facts: DeliveryFacts): Standing | null {
  if (facts.withdrawn) return null;
  if (facts.receipts.includes("refused")) return "refused";
  if (!facts.published) return facts.stopped ? "stopped" : "signed off";
  if (facts.stopped) return "stopped";
  return facts.recipients > 0 && facts.receipts.length === facts.recipients ? "received" : "delivered";
}
