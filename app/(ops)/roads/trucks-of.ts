import { type MapTruck } from '@/components/map/map-content';
import { type Storm } from '@/components/roads/decode-storm';
import { formatTime } from '@/lib/time/format';

/** The trucks that are out, as the map shows them. */
export function trucksOf({ view }: Storm, zone: string): MapTruck[] {
  return view.trucksOut.map((truck) => ({
    id: truck.id,
    number: truck.number,
    position: [truck.latDeg, truck.lonDeg],
    label:
      truck.lastRoad !== null && truck.lastLoggedAt !== null
        ? `Truck ${truck.number}, last logged on ${truck.lastRoad} at ${formatTime(truck.lastLoggedAt, zone)}`
        : `Truck ${truck.number}, at ${truck.yardName}`,
  }));
}
