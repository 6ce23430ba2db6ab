import type { ReactNode } from "react";

interface AccountPageProps {
  title: string;
  lead: string;
  form: ReactNode;
  /** The way to the other form. */
  otherwise: ReactNode;
}

/** A form on its sheet: said what for, filled in, and the other way named under it. */
export function AccountPage({ title, lead, form, otherwise }: AccountPageProps) {
  return (
    <main id="main" className="mx-auto w-full max-w-md px-4 py-10">
      <h1 className="title-wide text-xl">{title}</h1>
      <p className="mt-2 mb-6 text-ink-2">{lead}</p>
      {form}
      <p className="mt-6 border-t border-rule pt-4 text-ink-2">{otherwise}</p>
    </main>
  );
}
