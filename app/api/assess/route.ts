import { route } from "@/lib/action";
import { answerRequest } from "@/lib/diagnosis";

/** One request of the engine's plain form, one answer; the same mapping as the command line's. Stores nothing. */
export const POST = route("check:read", async ({ body }) => {
  const answer = answerRequest(body);
  return "error" in answer ? Response.json(answer, { status: 400, headers: { "Cache-Control": "no-store" } }) : answer;
});
