import { handle } from "@/app/handle";
import { cancelVersion } from "@/lib/versions/cancel-version";
import { versionIdInput } from "@/lib/versions/schema";

export const POST = handle(versionIdInput, cancelVersion);
