import type { NextRequest } from "next/server";
import NextAuth from "next-auth";
import { authOptions } from "@/lib/auth/options";

const answer = (request: NextRequest, segment: { params: Promise<{ nextauth: string[] }> }) =>
  NextAuth(request, segment, authOptions());

export { answer as GET, answer as POST };
