import { handle } from "@/app/handle";
import { getSetup } from "@/lib/setups/get-setup";
import { saveSetup } from "@/lib/setups/save-setup";
import { saveSetupInput } from "@/lib/setups/schema";
import { shotIdInput } from "@/lib/shots/schema";

export const GET = handle(shotIdInput, getSetup);
export const PUT = handle(saveSetupInput, saveSetup);
