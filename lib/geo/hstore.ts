/**
 * Tags out of PostgreSQL hstore text as GDAL writes `other_tags`: `"bridge"=>"yes","width"=>"3.5"`.
 * Backslash escapes the next character; a value of NULL is left out. Text that is not hstore gives the pairs
 * that could be read up to the place where it breaks off.
 */
export function parseHstore(text: string): Record<string, string> {
  const tags: Record<string, string> = {};
  const pair = /\s*"((?:[^"\\]|\\.)*)"\s*=>\s*(?:"((?:[^"\\]|\\.)*)"|(NULL))\s*(?:,|$)/gsy;
  for (let found = pair.exec(text); found; found = pair.exec(text)) {
    const [, key, value] = found;
    if (key !== undefined && value !== undefined) tags[unescape(key)] = unescape(value);
  }
  return tags;
}

function unescape(text: string): string {
  return text.replace(/\\(.)/gs, '$1');
}
