import { expect, it } from "vitest";
import { planFor, type Asked } from "@/service-worker/plan";

const keptFiles = new Set(["/_next/static/chunks/a.js", "/icon-192.png"]);
const navigation: Asked = {
  method: "GET",
  mode: "navigate",
  sameOrigin: true,
  path: "/field",
  fromRouter: false,
};

it.each<[string, Partial<Asked>, string]>([
  ["the field wing opens from the phone", {}, "shell"],
  ["so does the form of a rig sheet", { path: "/desk/sheet" }, "shell"],
  ["the first page asks the network first", { path: "/" }, "network-else-shell"],
  ["signing in asks it too", { path: "/sign-in" }, "network-else-shell"],
  ["any other page may end at the offline page", { path: "/desk" }, "network-else-offline"],
  ["signing up is one: it does nothing without the network", { path: "/sign-up" }, "network-else-offline"],
  ["a path below the field wing is another page", { path: "/field/x" }, "network-else-offline"],
  ["the router's request fails offline", { mode: "cors", fromRouter: true }, "leave"],
  ["even if it claims to be a navigation", { fromRouter: true }, "leave"],
  ["the API is never touched", { path: "/api/field/bundle", mode: "cors" }, "leave"],
  ["not even a download from it", { path: "/api/walks/1/record" }, "leave"],
  ["a kept file comes from the phone", { path: "/_next/static/chunks/a.js", mode: "no-cors" }, "file"],
  ["an icon too", { path: "/icon-192.png", mode: "no-cors" }, "file"],
  [
    "a file that was not kept is the browser's matter",
    { path: "/_next/static/chunks/b.js", mode: "no-cors" },
    "leave",
  ],
  ["a page fetched by a script is not a navigation", { mode: "cors" }, "leave"],
  ["a form that is posted", { method: "POST" }, "leave"],
  ["another site's page", { sameOrigin: false }, "leave"],
])("%s", (_, asked, plan) => {
  expect(planFor({ ...navigation, ...asked }, keptFiles)).toBe(plan);
});
