import { describe, expect, it } from 'vitest';
import { parseHstore } from './hstore';

describe('hstore text', () => {
  it('reads pairs whose values hold commas, arrows and escaped quotes', () => {
    expect(parseHstore('"note"=>"a, b => \\"c\\" \\\\","lanes:forward"=>"2"')).toEqual({
      note: 'a, b => "c" \\',
      'lanes:forward': '2',
    });
  });

  it('leaves NULL out, allows spaces, and keeps what came before a break', () => {
    expect(parseHstore('"lit"=>NULL, "width" => "3"')).toEqual({ width: '3' });
    expect(parseHstore('"lit"=>"no","wid')).toEqual({ lit: 'no' });
    expect(parseHstore('')).toEqual({});
  });
});
