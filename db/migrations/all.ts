import * as agencyAndPeople from './20261201T090000-create-agency-and-people';
import * as yardsMaterialsTrucks from './20261201T090100-create-yards-materials-trucks';
import * as network from './20261201T090200-create-network';
import * as stationsAndReadings from './20261201T090300-create-stations-and-readings';
import * as stormsAndPlans from './20261201T090400-create-storms-and-plans';
import * as runs from './20261201T090500-create-runs';
import * as auditLog from './20261201T090600-create-audit-log';
import * as networkSources from './20261201T091000-mark-network-sources';
import * as mergeReadings from './20261201T092000-merge-readings';
import * as segmentEnds from './20261201T092500-index-segment-ends';
import * as planInForce from './20261201T093000-find-plan-in-force';

/** In order; an imported list, since files cannot be looked up by name in a bundle. */
export const migrations = [
  { name: '20261201T090000-create-agency-and-people', ...agencyAndPeople },
  { name: '20261201T090100-create-yards-materials-trucks', ...yardsMaterialsTrucks },
  { name: '20261201T090200-create-network', ...network },
  { name: '20261201T090300-create-stations-and-readings', ...stationsAndReadings },
  { name: '20261201T090400-create-storms-and-plans', ...stormsAndPlans },
  { name: '20261201T090500-create-runs', ...runs },
  { name: '20261201T090600-create-audit-log', ...auditLog },
  { name: '20261201T091000-mark-network-sources', ...networkSources },
  { name: '20261201T092000-merge-readings', ...mergeReadings },
  { name: '20261201T092500-index-segment-ends', ...segmentEnds },
  { name: '20261201T093000-find-plan-in-force', ...planInForce },
];
