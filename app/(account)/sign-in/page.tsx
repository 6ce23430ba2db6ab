import type { Metadata } from "next";
import Link from "next/link";
import { redirect } from "next/navigation";
import { AccountPage } from "@/components/account/account-page";
import { SignInForm } from "@/components/account/sign-in-form";
import { currentSession } from "@/lib/accounts/session";
import { safeNext } from "@/lib/platform/safe-next";

export const metadata: Metadata = { title: "Sign in" };

export default async function SignInPage({ searchParams }: PageProps<"/sign-in">) {
  const next = safeNext((await searchParams).next);
  if (await currentSession()) redirect("/designs");
  return (
    <AccountPage
      title="Sign in"
      lead="What is on the Bench in this browser is saved to your shop as you come in."
      form={<SignInForm next={next} />}
      otherwise={
        <>
          No account yet?{" "}
          <Link
            className="link"
            href={{ pathname: "/sign-up", query: next ? { next } : undefined }}
          >
            Sign up
          </Link>
        </>
      }
    />
  );
}
