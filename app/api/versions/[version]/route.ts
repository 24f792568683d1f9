import { handle } from "@/app/handle";
import { getVersion } from "@/lib/versions/get-version";
import { versionIdInput } from "@/lib/versions/schema";

export const GET = handle(versionIdInput, getVersion);
