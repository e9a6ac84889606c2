import { describe, expect, it } from 'vitest';
import { classAssumption, classTarget, UNCLASSED } from './assumed';
import { readRoadTags } from './road-tags';

const yes = <T>(value: T) => ({ value, isAssumed: true });
const no = <T>(value: T) => ({ value, isAssumed: false });

describe('direction', () => {
  it.each([
    [{ oneway: 'yes' }, no('forward')],
    [{ oneway: '1' }, no('forward')],
    [{ oneway: '-1' }, no('backward')],
    [{ oneway: 'reverse' }, no('backward')],
    [{ oneway: 'no' }, no('both')],
    [{ oneway: 'F' }, no('forward')],
    [{ oneway: 'T' }, no('backward')],
    [{ oneway: 'B' }, no('both')],
    [{ junction: 'roundabout' }, no('forward')],
    [{ highway: 'motorway' }, yes('forward')],
    [{ highway: 'motorway_link' }, yes('forward')],
    [{ highway: 'motorway_link', oneway: 'no' }, no('both')],
    [{ highway: 'residential' }, no('both')],
  ])('%j → %j', (tags, direction) => {
    expect(readRoadTags({ highway: 'tertiary', ...tags }).direction).toEqual(direction);
  });

  it('a one-way tag that says nothing is named, and the class decides', () => {
    const road = readRoadTags({ highway: 'tertiary', oneway: 'maybe' });
    expect(road).toMatchObject({ direction: no('both'), remarks: [{ tag: 'oneway', text: 'maybe' }] });
  });
});

describe('lanes', () => {
  it('a tagged count is known; without one the class gives two, or one on a one-way street, and says so', () => {
    expect(readRoadTags({ highway: 'tertiary', lanes: '3' }).lanes).toEqual(no(3));
    expect(readRoadTags({ highway: 'tertiary' }).lanes).toEqual(yes(2));
    expect(readRoadTags({ highway: 'tertiary', oneway: 'yes' }).lanes).toEqual(yes(1));
    expect(readRoadTags({ highway: 'motorway' }).lanes).toEqual(yes(2));
  });

  it('lanes by direction add up to a total, and split one', () => {
    const tags = { highway: 'primary', 'lanes:forward': '1', 'lanes:backward': '2' };
    expect(readRoadTags(tags).lanes).toEqual(no(3));
    expect(readRoadTags({ highway: 'primary', lanes: '3', 'lanes:forward': '1' })).toMatchObject({
      lanesForward: no(1),
      lanesBackward: no(2),
    });
    expect(readRoadTags({ highway: 'primary', lanes: '3' }).lanesForward).toEqual(yes(2));
  });

  it('all lanes of a one-way road run its way, and a single track counts both ways', () => {
    expect(readRoadTags({ highway: 'primary', lanes: '2', oneway: 'yes' })).toMatchObject({
      lanesForward: no(2),
      lanesBackward: no(0),
    });
    expect(readRoadTags({ highway: 'service', lanes: '1' })).toMatchObject({
      lanesForward: no(1),
      lanesBackward: no(1),
    });
  });

  it('a two-way road tagged 3 m wide has one lane, assumed', () => {
    expect(readRoadTags({ highway: 'residential', width: '3' })).toMatchObject({ lanes: yes(1), widthM: no(3) });
  });

  it('“two” and 40 lanes are not believed', () => {
    for (const lanes of ['two', '40']) {
      expect(readRoadTags({ highway: 'primary', lanes })).toMatchObject({ lanes: yes(2), remarks: [{ tag: 'lanes' }] });
    }
  });
});

describe('speed, surface, width, structures', () => {
  it('an unlimited motorway gets the speed of its class, marked as assumed, without complaint', () => {
    const road = readRoadTags({ highway: 'motorway', maxspeed: 'none' });
    expect(road.speedKmPerH).toEqual(yes(classAssumption('motorway').speedKmPerH));
    expect(road.remarks).toEqual([]);
  });

  it('a zone in source:maxspeed counts when there is no sign', () => {
    expect(readRoadTags({ highway: 'tertiary', 'source:maxspeed': 'DE:rural' }).speedKmPerH).toEqual(no(100));
    expect(readRoadTags({ highway: 'tertiary', maxspeed: '70', 'source:maxspeed': 'DE:rural' }).speedKmPerH).toEqual(
      no(70),
    );
  });

  it('“paved” is not gravel, but what it is remains assumed', () => {
    expect(readRoadTags({ highway: 'residential', surface: 'paved' }).surface).toEqual(yes('asphalt'));
    expect(readRoadTags({ highway: 'residential', surface: 'sand' }).surface).toEqual(no('gravel'));
    expect(readRoadTags({ highway: 'residential', surface: 'sett' }).surface).toEqual(no('paving'));
    expect(readRoadTags({ highway: 'residential', surface: 'jelly' }).remarks).toHaveLength(1);
  });

  it('an estimated width is used and marked; no width is lanes times the lane width of the class', () => {
    expect(readRoadTags({ highway: 'tertiary', est_width: '6' }).widthM).toEqual(yes(6));
    expect(readRoadTags({ highway: 'tertiary' }).widthM).toEqual(yes(2 * classAssumption('tertiary').laneWidthM));
  });

  it('a bridge is one level up, a tunnel one down, and a layer tag overrules both', () => {
    expect(readRoadTags({ highway: 'primary', bridge: 'viaduct' })).toMatchObject({ isBridge: no(true), level: 1 });
    expect(readRoadTags({ highway: 'primary', bridge: 'no' })).toMatchObject({ isBridge: no(false), level: 0 });
    expect(readRoadTags({ highway: 'primary', tunnel: 'yes' })).toMatchObject({ isTunnel: no(true), level: -1 });
    expect(readRoadTags({ highway: 'primary', bridge: 'yes', layer: '2' }).level).toBe(2);
  });

  it('private and closed roads are told apart', () => {
    expect(readRoadTags({ highway: 'service', access: 'private' }).isClosed).toBe(true);
    expect(readRoadTags({ highway: 'service', access: 'no', motor_vehicle: 'yes' }).isClosed).toBe(false);
  });
});

describe('classes', () => {
  it('comes from highway, else from the column of a shape file, else is “no class” and assumed', () => {
    expect(readRoadTags({ highway: 'Primary;secondary' }).roadClass).toEqual(no('primary'));
    expect(readRoadTags({ fclass: 'tertiary' }).roadClass).toEqual(no('tertiary'));
    expect(readRoadTags({}).roadClass).toEqual(yes(UNCLASSED));
    expect(readRoadTags({ railway: 'rail' }).roadClass).toEqual(no('not a road'));
  });

  it('goes where the person says, otherwise where the table says', () => {
    expect(classTarget('residential', {})).toBe('D');
    expect(classTarget('residential', { residential: 'B' })).toBe('B');
    expect(classTarget('residential', { residential: 'leave-out' })).toBe('leave-out');
    expect(classTarget('footway', {})).toBe('leave-out');
    expect(classTarget('never seen', {})).toBe('C');
    expect(classTarget('toString', {})).toBe('C');
  });
});
