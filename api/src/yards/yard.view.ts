import type { YardView } from '@brimgate/rules';
import type { YardModel } from './yard.model';

export function toYardView(row: YardModel): YardView {
  return {
    id: row.uuid,
    name: row.name,
    timeZone: row.timeZone,
    advisoryEmail: row.advisoryEmail,
    complianceGate: row.complianceGate,
    capSignOff: row.capSignOff,
    capNitrogenKgPerHead: row.capNitrogenKgPerHead,
    capPhosphorusKgPerHead: row.capPhosphorusKgPerHead,
    version: row.version,
  };
}
