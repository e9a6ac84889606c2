import { type Sequelize } from 'sequelize';
import { initAgency } from './agency';
import { initAuditRecord } from './audit-record';
import { initBaseFeature } from './base-feature';
import { initForecast } from './forecast';
import { initForecastHour } from './forecast-hour';
import { initLoad } from './load';
import { initMaterial } from './material';
import { initNetworkImport } from './network-import';
import { initNode } from './node';
import { initPerson } from './person';
import { initPlan } from './plan';
import { initPlanTreatment } from './plan-treatment';
import { initPolicy } from './policy';
import { initReading } from './reading';
import { initRoute } from './route';
import { initRouteSegment } from './route-segment';
import { initRun } from './run';
import { initRunSegment } from './run-segment';
import { initSegment } from './segment';
import { initSensor } from './sensor';
import { initSignInAttempt } from './sign-in-attempt';
import { initSpreadEntry } from './spread-entry';
import { initSpreader } from './spreader';
import { initStation } from './station';
import { initStationKey } from './station-key';
import { initStationMapping } from './station-mapping';
import { initStorm } from './storm';
import { initStormPass } from './storm-pass';
import { initTruck } from './truck';
import { initUpload } from './upload';
import { initUploadReject } from './upload-reject';
import { initYard } from './yard';

/** Every model, initialised on one connection. */
export function initModels(sequelize: Sequelize) {
  return {
    Agency: initAgency(sequelize),
    AuditRecord: initAuditRecord(sequelize),
    BaseFeature: initBaseFeature(sequelize),
    Forecast: initForecast(sequelize),
    ForecastHour: initForecastHour(sequelize),
    Load: initLoad(sequelize),
    Material: initMaterial(sequelize),
    NetworkImport: initNetworkImport(sequelize),
    Node: initNode(sequelize),
    Person: initPerson(sequelize),
    Plan: initPlan(sequelize),
    PlanTreatment: initPlanTreatment(sequelize),
    Policy: initPolicy(sequelize),
    Reading: initReading(sequelize),
    Route: initRoute(sequelize),
    RouteSegment: initRouteSegment(sequelize),
    Run: initRun(sequelize),
    RunSegment: initRunSegment(sequelize),
    Segment: initSegment(sequelize),
    Sensor: initSensor(sequelize),
    SignInAttempt: initSignInAttempt(sequelize),
    SpreadEntry: initSpreadEntry(sequelize),
    Spreader: initSpreader(sequelize),
    Station: initStation(sequelize),
    StationKey: initStationKey(sequelize),
    StationMapping: initStationMapping(sequelize),
    Storm: initStorm(sequelize),
    StormPass: initStormPass(sequelize),
    Truck: initTruck(sequelize),
    Upload: initUpload(sequelize),
    UploadReject: initUploadReject(sequelize),
    Yard: initYard(sequelize),
  };
}

export type Models = ReturnType<typeof initModels>;
