import { askToKeep } from "./persistence";

/** What an installed Hookfast means in this browser, and what is to be said of it before someone signs in. */
export type InstallSituation =
  /** This is the installed app. */
  | "installed"
  /** An app on the home screen has a store and a session of its own: install first, then sign in there. */
  | "own-store"
  /** The browser offers to install, with a dialog of its own. */
  | "offered"
  /** Nothing is known but that a browser may clear what was not installed. */
  | "plain";

export interface InstallFacts {
  standalone: boolean;
  /** `navigator.standalone` exists only in browsers of iPhones and iPads, whatever they call themselves. */
  homeScreen: boolean;
  offered: boolean;
}

export function installSituation({ standalone, homeScreen, offered }: InstallFacts): InstallSituation {
  if (standalone) return "installed";
  if (homeScreen) return "own-store";
  return offered ? "offered" : "plain";
}

/** The browser's own offer to install; TypeScript's types lack it. */
interface InstallPrompt extends Event {
  prompt: () => Promise<{ outcome: "accepted" | "dismissed" }>;
}

let prompt: InstallPrompt | null = null;
let installedNow = false;
const listeners = new Set<() => void>();

/** Keeps the browser's offer for our own button; the browser makes it once, soon after a page has loaded. */
export function followInstallOffer(): () => void {
  const offered = (event: Event) => {
    event.preventDefault();
    prompt = event as InstallPrompt;
    listeners.forEach((listener) => listener());
  };
  const installed = () => {
    prompt = null;
    installedNow = true;
    void askToKeep();
    listeners.forEach((listener) => listener());
  };
  window.addEventListener("beforeinstallprompt", offered);
  window.addEventListener("appinstalled", installed);
  return () => {
    window.removeEventListener("beforeinstallprompt", offered);
    window.removeEventListener("appinstalled", installed);
  };
}

export function subscribeInstall(listener: () => void): () => void {
  listeners.add(listener);
  return () => listeners.delete(listener);
}

/** What this browser says of itself now. */
export function installNow(): InstallSituation {
  const own = (navigator as { standalone?: unknown }).standalone;
  const displayed = ["standalone", "fullscreen", "minimal-ui"].some(
    (mode) => window.matchMedia(`(display-mode: ${mode})`).matches,
  );
  return installSituation({
    standalone: displayed || own === true || installedNow,
    homeScreen: typeof own === "boolean",
    offered: prompt !== null,
  });
}

/** Opens the browser's own dialog, which it allows once an offer. */
export async function promptInstall(): Promise<void> {
  const offer = prompt;
  prompt = null;
  await offer?.prompt();
  listeners.forEach((listener) => listener());
}
