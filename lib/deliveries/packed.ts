import type { PlannedItem } from "./plan-delivery";

/** What a delivery's texts are composed from. */
export interface Packed {
  production: string;
  number: number;
  title: string;
  words: string;
  items: PlannedItem[];
}
