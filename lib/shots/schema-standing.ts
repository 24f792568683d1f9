// The words shots are sorted and told apart by. Apart from the schemas, so that a page of shots need not load zod.
export const standings = [
  "open",
  "rendering",
  "stopped",
  "ready",
  "in review",
  "returned",
  "signed off",
  "delivered",
  "received",
  "refused",
  "on hold",
  "omitted",
] as const;
export type Standing = (typeof standings)[number];

export const shotOrders = ["sequence", "due date", "standing", "machine time"] as const;
export type ShotOrder = (typeof shotOrders)[number];
