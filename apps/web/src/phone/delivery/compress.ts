/** Below this size compression saves no packet, bytes. */
const worthIt = 1_024;

interface JsonBody {
  body: BodyInit;
  headers: Record<string, string>;
}

/** A JSON body, in gzip where the browser can and where it is worth it. */
export async function compressed(json: string): Promise<JsonBody> {
  const headers = { 'content-type': 'application/json' };
  if (json.length < worthIt || typeof CompressionStream === 'undefined') return { body: json, headers };
  const stream = new Blob([json]).stream().pipeThrough(new CompressionStream('gzip'));
  const bytes = await new Response(stream).arrayBuffer();
  return { body: bytes, headers: { ...headers, 'content-encoding': 'gzip' } };
}
