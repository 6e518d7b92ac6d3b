import "server-only";
import { pino } from "pino";

/**
 * The log, one JSON object a line on standard output. Of an error only what helps: the statement that failed could
 * hold what people wrote.
 */
export const log = pino({
  level: process.env.NODE_ENV === "test" ? "silent" : "info",
  serializers: {
    err: ({ name, message, stack, parent }: Error & { parent?: { code?: string } }) => ({
      name,
      message: message.slice(0, 300),
      code: parent?.code,
      stack,
    }),
  },
});
