/**
 * A random UUID (version 4, RFC 9562). `crypto.randomUUID` is missing where a workshop serves the
 * pages over plain http; random bytes are not.
 */
export function newKey(): string {
  const bytes = crypto.getRandomValues(new Uint8Array(16));
  const hex = [...bytes].map((byte, index) => {
    if (index === 6) return ((byte & 0x0f) | 0x40).toString(16).padStart(2, '0');
    if (index === 8) return ((byte & 0x3f) | 0x80).toString(16).padStart(2, '0');
    return byte.toString(16).padStart(2, '0');
  });
  const groups = [
    hex.slice(0, 4),
    hex.slice(4, 6),
    hex.slice(6, 8),
    hex.slice(8, 10),
    hex.slice(10),
  ];
  return groups.map((group) => group.join('')).join('-');
}
