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
