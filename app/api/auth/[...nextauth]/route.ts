import NextAuth from 'next-auth';
import type { NextRequest } from 'next/server';
import { authOptions } from '@/lib/web/auth-options';
import { problemOf, problemResponse } from '@/lib/web/problem';

/** A sign-in form is small; its handler reads bodies whole. */
const MAX_BODY_BYTES = 20_000;

type Context = { params: Promise<{ nextauth: string[] }> };

export async function GET(request: NextRequest, context: Context): Promise<Response> {
  return NextAuth(request, context, authOptions());
}

export async function POST(request: NextRequest, context: Context): Promise<Response> {
  const length = Number(request.headers.get('content-length') ?? Number.NaN);
  if (!(length <= MAX_BODY_BYTES)) {
    return problemResponse(problemOf(413, 'too-large', { detail: 'A sign-in is at most 20 kB, its length told.' }));
  }
  try {
    return await NextAuth(request, context, authOptions());
  } catch (error) {
    if (!(error instanceof SyntaxError)) throw error;
    return problemResponse(problemOf(400, 'not-json', { detail: 'The body is not what its content type says.' }));
  }
}
