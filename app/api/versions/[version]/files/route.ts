import { handle } from "@/app/handle";
import { listFiles } from "@/lib/versions/list-files";
import { filesInput } from "@/lib/versions/schema";

export const GET = handle(filesInput, listFiles);
