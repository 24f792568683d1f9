import type { Metadata } from "next";
import { notFound } from "next/navigation";
import { load } from "@/app/load";
import { VerdictPage } from "@/components/verdict/verdict-page";
import { getDeclaration } from "@/lib/reviews/get-declaration";
import { versionIdSchema } from "@/lib/reviews/schema";

export const metadata: Metadata = { title: "Verdict" };

export default async function Page({ params }: { params: Promise<{ version: string }> }) {
  const wanted = versionIdSchema.safeParse(await params);
  if (!wanted.success) notFound();
  return <VerdictPage facts={await load(getDeclaration, wanted.data)} />;
}
