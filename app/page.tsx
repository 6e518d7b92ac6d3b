import { FrontPage } from "@/components/session/front-page";

export const dynamic = "error";

export default function Page() {
  return <FrontPage />;
}
