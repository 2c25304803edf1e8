/**
 * The export bundle: a first line, then sections. Each section is one line of JSON, as many raw bytes as that line says,
 * and a line feed. It is read from its beginning, so a bundle that was cut off still gives everything before the cut.
 */
export const bundleFirstLine = 'RIMEWARD-BUNDLE 1\n';

/** What the line before each piece of content says. `bytes` is the length of the content that follows. */
export type SectionHeader =
  | { kind: 'manifest'; bytes: number }
  | { kind: 'entry'; device: string; seq: number; hash: string; bytes: number }
  | { kind: 'photo'; device: string; sha256: string; type: string; bytes: number };

/** The line that goes before a section's content. */
export function sectionLine(header: SectionHeader): string {
  return `${JSON.stringify(header)}\n`;
}

/** What follows a section's content. */
export const sectionEnd = '\n';

export interface BundleSection {
  header: SectionHeader;
  content: Uint8Array;
}

export interface BundleReading {
  sections: BundleSection[];
  /** False when the bundle ends in the middle of a section, or holds something that is none. */
  whole: boolean;
}

/** Reads a bundle as far as it goes; null when it is not one. Contents are views of `bytes`, not copies. */
export function readBundle(bytes: Uint8Array): BundleReading | null {
  const first = lineAt(bytes, 0);
  if (first === null || `${first}\n` !== bundleFirstLine) return null;
  const sections: BundleSection[] = [];
  let at = bundleFirstLine.length;
  while (at < bytes.length) {
    const line = lineAt(bytes, at);
    const header = line === null ? null : readSectionHeader(line);
    if (line === null || header === null) return { sections, whole: false };
    const start = at + line.length + 1;
    const end = start + header.bytes;
    if (bytes[end] !== 0x0a) return { sections, whole: false };
    sections.push({ header, content: bytes.subarray(start, end) });
    at = end + 1;
  }
  return { sections, whole: true };
}

const longestLine = 1_024;

/** One line of printable ASCII without its line feed. */
function lineAt(bytes: Uint8Array, at: number): string | null {
  const end = bytes.indexOf(0x0a, at);
  if (end === -1 || end - at > longestLine) return null;
  const line = bytes.subarray(at, end);
  return line.every((byte) => byte >= 0x20 && byte < 0x7f) ? String.fromCharCode(...line) : null;
}

function readSectionHeader(line: string): SectionHeader | null {
  let value: unknown;
  try {
    value = JSON.parse(line);
  } catch {
    return null;
  }
  if (typeof value !== 'object' || value === null) return null;
  const header = value as Record<string, unknown>;
  const texts = (...keys: string[]): boolean => keys.every((key) => typeof header[key] === 'string');
  const counts = (...keys: string[]): boolean =>
    keys.every((key) => Number.isSafeInteger(header[key]) && (header[key] as number) >= 0);
  if (!counts('bytes')) return null;
  if (header['kind'] === 'manifest') return value as SectionHeader;
  if (header['kind'] === 'entry' && texts('device', 'hash') && counts('seq')) return value as SectionHeader;
  if (header['kind'] === 'photo' && texts('device', 'sha256', 'type')) return value as SectionHeader;
  return null;
}
