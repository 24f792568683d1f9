import { notFound } from "next/navigation";
import { load } from "@/app/load";
import { BenchPage } from "@/components/bench/bench-page";
import { getSetup } from "@/lib/setups/get-setup";
import { shotIdInput } from "@/lib/shots/schema";

type Params = Promise<{ shot: string }>;

export async function generateMetadata({ params }: { params: Params }) {
  const wanted = shotIdInput.safeParse(await params);
  return { title: wanted.success ? (await load(getSetup, wanted.data)).shot.code : "Bench" };
}

export default async function Page({ params }: { params: Params }) {
  const wanted = shotIdInput.safeParse(await params);
  if (!wanted.success) notFound();
  const page = await load(getSetup, wanted.data);
  // Someone else's save draws a reader's form anew; an artist's own form tells them when they save.
  return <BenchPage key={page.may.save ? page.shot.id : page.revision} page={page} />;
}
