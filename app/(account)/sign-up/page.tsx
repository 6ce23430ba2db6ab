import type { Metadata } from "next";
import Link from "next/link";
import { redirect } from "next/navigation";
import { AccountPage } from "@/components/account/account-page";
import { SignUpForm } from "@/components/account/sign-up-form";
import { currentSession } from "@/lib/accounts/session";
import { safeNext } from "@/lib/platform/safe-next";

export const metadata: Metadata = { title: "Sign up" };

export default async function SignUpPage({ searchParams }: PageProps<"/sign-up">) {
  const next = safeNext((await searchParams).next);
  if (await currentSession()) redirect("/designs");
  return (
    <AccountPage
      title="Open your shop"
      lead="An account keeps your designs. What you made on the Bench in this browser comes with you."
      form={<SignUpForm next={next} />}
      otherwise={
        <>
          Have an account?{" "}
          <Link
            className="link"
            href={{ pathname: "/sign-in", query: next ? { next } : undefined }}
          >
            Sign in
          </Link>
        </>
      }
    />
  );
}
