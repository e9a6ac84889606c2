/**
 * Decodes an encoded polyline (differences of latitude and longitude in 1e-5 degrees, five bits a character from code
 * 63 on, zigzag sign) to `[latDeg, lonDeg]` points. `_p~iF~ps|U` is [38.5, −120.2]. A text that ends within a number
 * throws RangeError.
 */
export function decodePolyline(text: string): [latDeg: number, lonDeg: number][] {
  const points: [number, number][] = [];
  let at = 0;
  const next = (): number => {
    let shift = 0;
    let value = 0;
    for (;;) {
      if (at >= text.length) throw new RangeError('The polyline ends within a number');
      const bits = text.charCodeAt(at) - 63;
      at += 1;
      value += (bits & 31) * 2 ** shift;
      shift += 5;
      if (bits < 32) break;
    }
    return value % 2 === 1 ? -(value + 1) / 2 : value / 2;
  };
  let lat = 0;
  let lon = 0;
  while (at < text.length) {
    lat += next();
    lon += next();
    points.push([lat / 1e5, lon / 1e5]);
  }
  return points;
}
