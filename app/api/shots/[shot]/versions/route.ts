import { handle } from "@/app/handle";
import { shotIdInput } from "@/lib/shots/schema";
import { listVersions } from "@/lib/versions/list-versions";
import { renderVersion } from "@/lib/versions/render-version";
import { renderVersionInput } from "@/lib/versions/schema";

export const GET = handle(shotIdInput, listVersions);
export const POST = handle(renderVersionInput, renderVersion);
