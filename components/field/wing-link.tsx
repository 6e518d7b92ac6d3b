import type { MouseEvent, ReactNode } from "react";
import { goTo, hrefOf } from "./address";

type WingLinkProps = {
  walk?: string;
  at?: string;
  paper?: string;
  prompt?: string;
  className?: string;
  children: ReactNode;
};

/** A link inside the wing: its screen changes without a request; opened in a new tab it is an ordinary address. */
export function WingLink({ className, children, ...address }: WingLinkProps) {
  const follow = (event: MouseEvent) => {
    if (event.metaKey || event.ctrlKey || event.shiftKey || event.altKey || event.button !== 0) return;
    event.preventDefault();
    goTo(address);
  };
  return (
    <a href={hrefOf(address)} onClick={follow} className={className}>
      {children}
    </a>
  );
}
