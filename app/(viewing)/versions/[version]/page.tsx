import { notFound } from "next/navigation";
import { load } from "@/app/load";
import { VersionPage } from "@/components/version/version-page";
import { getVersion } from "@/lib/versions/get-version";
import { listFiles } from "@/lib/versions/list-files";
import { filesInput } from "@/lib/versions/schema";

type Params = Promise<{ version: string }>;

export async function generateMetadata({ params }: { params: Params }) {
  const wanted = filesInput.safeParse(await params);
  if (!wanted.success) return { title: "Version" };
  const { shot, number } = await load(getVersion, wanted.data);
  return { title: `${shot.code} version ${number}` };
}

export default async function Page({ params }: { params: Params }) {
  const wanted = filesInput.safeParse(await params);
  if (!wanted.success) notFound();
  const [version, files] = await Promise.all([load(getVersion, wanted.data), load(listFiles, wanted.data)]);
  return <VersionPage version={version} files={files} />;
}
