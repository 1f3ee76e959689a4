const WARNING_LEVEL = 40;

function levelOf(line) {
  try {
    return JSON.parse(line).level;
  } catch {
    return undefined;
  }
}

// The application logs JSON lines with a level; Next and Node write text.
function isWarning(line) {
  const level = levelOf(line);
  return typeof level === "number" ? level >= WARNING_LEVEL : /⨯|⚠|\b(error|warning)\b/i.test(line);
}

/** The lines of a server's log that warn or report an error. */
export const warningsIn = (log) => log.split("\n").filter(isWarning);
