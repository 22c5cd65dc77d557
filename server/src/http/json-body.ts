import type { IncomingMessage } from 'node:http';
import { badRequest, HttpError } from './http-error.ts';

/** Largest body of a request, bytes; a design document with every count at its limit has about 60 kB. */
const LARGEST_BODY = 1_000_000;

/**
 * Half of a surrogate pair as `JSON.stringify` writes it, which escapes no whole pair. JSON can say it, UTF-8 and the database
 * cannot. An even number of backslashes before it is text that only looks so.
 */
const HALF_CHARACTER = /(?<!\\)(?:\\\\)*\\ud[89a-f][0-9a-f]{2}/;

/** Deeper than any document goes; what reads bodies after this calls itself for every level. */
const DEEPEST = 100;

/** A control character as `JSON.stringify` writes it, line ends and tabs apart: nothing that a hand types. */
const CONTROL_CHARACTER = /(?<!\\)(?:\\\\)*\\(?:u00[01][0-9a-f]|[bf])/;

const tooLarge = () =>
  new HttpError(413, 'too-large', 'Too large', {
    detail:
      'This is more than the 1 MB that one request may hold. Nothing was kept. Send a smaller document.',
  });

const wrongType = () =>
  new HttpError(415, 'wrong-content-type', 'Wrong content type', {
    detail: 'Send JSON in UTF-8, uncompressed, with Content-Type: application/json.',
  });

/**
 * Reads the JSON body of a request.
 *
 * `express.json()` reads a body that it has refused to its end before it answers: 100 MB would come in whole. Here
 * the answer goes out as soon as the limit is passed.
 *
 * @throws HttpError 413, 415, or 400 for what is not JSON or holds half a character
 */
export async function readJsonBody(req: IncomingMessage): Promise<unknown> {
  refuseHeaders(req);
  const sent = decode(await collect(req));
  let body: unknown;
  try {
    body = JSON.parse(sent);
  } catch {
    throw badRequest('The body of the request is not JSON. Nothing was kept.');
  }
  if (depthOf(body) > DEEPEST) {
    throw badRequest(`The body of the request is nested more than ${DEEPEST} deep. Nothing was kept.`);
  }
  const text = JSON.stringify(body);
  if (CONTROL_CHARACTER.test(text)) {
    throw badRequest('A text holds a control character. Type it again. Nothing was kept.');
  }
  if (HALF_CHARACTER.test(text)) {
    throw badRequest('A text holds half a character. Type it again. Nothing was kept.');
  }
  return body;
}

/** Levels of lists and objects, no further than one beyond the deepest allowed; level by level, not by recursion. */
function depthOf(body: unknown): number {
  let level: unknown[] = [body];
  let depth = 0;
  while (level.length > 0 && depth <= DEEPEST) {
    level = level.flatMap((value): unknown[] =>
      typeof value === 'object' && value !== null ? Object.values(value) : [],
    );
    depth += 1;
  }
  return depth;
}

function refuseHeaders({ headers }: IncomingMessage): void {
  if (Number(headers['content-length'] ?? 0) > LARGEST_BODY) throw tooLarge();
  const type = /^application\/json\s*(?:;\s*charset\s*=\s*"?utf-8"?\s*)?$/i;
  if (!type.test(headers['content-type'] ?? '')) throw wrongType();
  if ((headers['content-encoding'] ?? 'identity') !== 'identity') throw wrongType();
}

async function collect(req: IncomingMessage): Promise<Buffer> {
  const chunks: Buffer[] = [];
  let size = 0;
  await new Promise<void>((resolve, reject) => {
    req.on('data', (chunk: Buffer) => {
      size += chunk.length;
      if (size > LARGEST_BODY) {
        req.removeAllListeners('data');
        reject(tooLarge());
      } else {
        chunks.push(chunk);
      }
    });
    req.once('end', resolve);
    req.once('error', reject);
    req.once('close', () => {
      if (!req.complete) reject(badRequest('The request broke off. Nothing was kept.'));
    });
  });
  return Buffer.concat(chunks);
}

function decode(bytes: Buffer): string {
  try {
    return new TextDecoder('utf-8', { fatal: true }).decode(bytes);
  } catch {
    throw badRequest('The body of the request is not UTF-8. Nothing was kept.');
  }
}

/** How long the client has to notice a refusal while it is still sending, ms. */
const LINGER_MS = 500;

/** Ends the connection of a request whose body nobody will read, once the answer had time to arrive. */
export function cutOffUnread(req: IncomingMessage): void {
  if (req.complete) return;
  req.resume();
  setTimeout(() => {
    if (!req.complete) req.socket.destroy();
  }, LINGER_MS).unref();
}
