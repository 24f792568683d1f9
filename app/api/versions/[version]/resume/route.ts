import { handle } from "@/app/handle";
import { resumeVersion } from "@/lib/versions/resume-version";
import { versionIdInput } from "@/lib/versions/schema";

export const POST = handle(versionIdInput, resumeVersion);
