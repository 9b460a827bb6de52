/** A short text that is practically never the same for two different lists: two hashes after FNV-1a (Fowler, Noll, Vo). */
export function fingerprint(parts: readonly string[]): string {
  let low = 0x811c9dc5;
  let high = 0xcbf29ce4;
  for (const part of parts) {
    for (let i = 0; i <= part.length; i++) {
      // The end of each part counts too, so that ["ab", "c"] differs from ["a", "bc"].
      const unit = i < part.length ? part.charCodeAt(i) : 0xffff;
      low = Math.imul(low ^ unit, 0x01000193);
      high = Math.imul(high ^ unit ^ (low >>> 16), 0x01000193);
    }
  }
  return ((high >>> 0).toString(36) + (low >>> 0).toString(36)).padStart(10, "0");
}
