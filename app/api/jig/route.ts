import { answerCommand } from "@/lib/document/answer-command";
import { route } from "@/lib/platform/route";

export const POST = route(({ request }) => answerCommand("jig", request));
