import { handle } from "@/app/handle";
import { changeShots } from "@/lib/shots/change-shots";
import { createShot } from "@/lib/shots/create-shot";
import { listShots } from "@/lib/shots/list-shots";
import { changeShotsInput, createShotInput, listShotsInput } from "@/lib/shots/schema";

export const GET = handle(listShotsInput, listShots);
export const POST = handle(createShotInput, createShot);
export const PATCH = handle(changeShotsInput, changeShots);
