import { YardInput, type YardView } from '@brimgate/rules';
import { typedNumber } from '../../lib/form/judged';
import { textFromNumber } from '../../lib/form/number-text';
import { typedResolver } from '../../lib/form/typed-resolver';

/** The yard as typed: text stays text until it is saved. */
export interface YardFormValues {
  name: string;
  timeZone: string;
  advisoryEmail: string;
  complianceGate: boolean;
  capSignOff: YardInput['capSignOff'];
  capNitrogenKgPerHead: string;
  capPhosphorusKgPerHead: string;
}

/** What each field is called, in the form and where a conflict names it; its order is the form's. */
export const yardFieldLabels: Readonly<Record<keyof YardFormValues, string>> = {
  name: 'Name',
  timeZone: 'Time zone',
  advisoryEmail: 'Advisories go to',
  complianceGate: 'Compliance staff sign every version before release',
  capNitrogenKgPerHead: 'Nitrogen cap',
  capPhosphorusKgPerHead: 'Phosphorus cap',
  capSignOff: 'Going over a cap asks for',
};

export function yardFormOf(yard: YardView): YardFormValues {
  return {
    name: yard.name,
    timeZone: yard.timeZone,
    advisoryEmail: yard.advisoryEmail,
    complianceGate: yard.complianceGate,
    capSignOff: yard.capSignOff,
    capNitrogenKgPerHead: textFromNumber(yard.capNitrogenKgPerHead),
    capPhosphorusKgPerHead: textFromNumber(yard.capPhosphorusKgPerHead),
  };
}

// An empty box means that the yard has no cap, which is not a cap of 0.
const capOf = (text: string) => typedNumber(text) ?? null;

export const yardResolver = typedResolver<YardFormValues, typeof YardInput>({
  schema: YardInput,
  candidateOf: (values) => ({
    ...values,
    capNitrogenKgPerHead: capOf(values.capNitrogenKgPerHead),
    capPhosphorusKgPerHead: capOf(values.capPhosphorusKgPerHead),
  }),
});

/** The zones this browser knows, with the yard's own among them even if it does not. */
export function timeZoneChoices(current: string): string[] {
  const known = Intl.supportedValuesOf('timeZone');
  return known.includes(current) ? known : [current, ...known];
}
