// The shapes the deliveries' pages are handed, as the verbs return them.
export type { DeliveredSet } from "./find-sets";
export type { DeliveryPage } from "./get-delivery";
export type { DoorPage } from "./get-door";
export type { DeliveryLine } from "./list-deliveries";
export type { DoorFile } from "./list-door-files";
export type { DoorLine } from "./list-doors";
export type { SignedRun, SignedRuns } from "./list-signed";
export type { DeliverySize } from "./measure-delivery";
