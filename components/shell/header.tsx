import Link from "next/link";
import { AccountMenu } from "./account-menu";
import { Mark } from "./mark";
import { NavLinks } from "./nav-links";
import { UnitsMenu } from "./units-menu";
import { VisitorMenu } from "./visitor-menu";

export interface SignedInAs {
  person: string;
  shop: string;
}

/** The line over every page: where one is, where one can go, how numbers read, who one is. */
export function Header({ account }: { account: SignedInAs | null }) {
  return (
    <header className="site-header">
      <Link href="/" className="flex min-h-11 items-center gap-2.5 pr-2">
        <Mark />
        <span className="title-wide text-lg">Ventwright</span>
      </Link>
      <nav aria-label="Main" className="ml-3 hidden sm:flex">
        <NavLinks className="header-item" />
      </nav>
      <div className="ml-auto flex items-center">
        <UnitsMenu />
        {account ? <AccountMenu account={account} /> : <VisitorMenu />}
      </div>
    </header>
  );
}
