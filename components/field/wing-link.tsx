import type { MouseEvent, ReactNode } from "react";
import { goTo, hrefOf } from "./address";

type WingLinkProps = {
  walk?: string;
  at?: string;
  settings?: true;
  className?: string;
  children: ReactNode;
};

/** A link inside the wing: its screen changes without a request; opened in a new tab it is an ordinary address. */
export function WingLink({ walk, at, settings, className, children }: WingLinkProps) {
  const follow = (event: MouseEvent) => {
    if (event.metaKey || event.ctrlKey || event.shiftKey || event.altKey || event.button !== 0) return;
    event.preventDefault();
    goTo({ walk, at, settings });
  };
  return (
    <a href={hrefOf({ walk, at, settings })} onClick={follow} className={className}>
      {children}
    </a>
  );
}
