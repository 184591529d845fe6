import type { Role } from '@brimgate/rules';

export type DemoYard = {
  name: string;
  timeZone: string;
  advisoryEmail: string;
  capNitrogenKgPerHead: number | null;
  capPhosphorusKgPerHead: number | null;
};
export type DemoMember = { name: string; email: string; licence: string | null; role: Role; yards: readonly string[] };
export type DemoFirm = { name: string; yards: readonly DemoYard[]; members: readonly DemoMember[] };

export const TAMARACK_DRAW = 'Tamarack Draw';
export const SORREL_FLAT = 'Sorrel Flat';
export const ALKALI_BENCH = 'Alkali Bench';

const rosa = {
  name: 'Rosa Villasana DVM',
  email: 'rosa@greasewood.example',
  licence: 'Licence V-20417 (invented)',
  role: 'veterinarian',
} as const;

/** An operation of our own: no firm, person or place of this name is meant. */
export const demoFirms: readonly DemoFirm[] = [
  {
    name: 'Greasewood Ration Works',
    yards: [
      {
        name: TAMARACK_DRAW,
        timeZone: 'America/Denver',
        advisoryEmail: 'office@tamarack-draw.example',
        capNitrogenKgPerHead: 36,
        capPhosphorusKgPerHead: 6,
      },
      {
        name: SORREL_FLAT,
        timeZone: 'America/Chicago',
        advisoryEmail: 'office@sorrel-flat.example',
        capNitrogenKgPerHead: null,
        capPhosphorusKgPerHead: null,
      },
    ],
    members: [
      {
        name: 'Nora Aldous',
        email: 'nora@greasewood.example',
        licence: null,
        role: 'nutritionist',
        yards: [TAMARACK_DRAW, SORREL_FLAT],
      },
      { ...rosa, yards: [TAMARACK_DRAW, SORREL_FLAT] },
      {
        name: 'Jonah Ferris',
        email: 'jonah@greasewood.example',
        licence: null,
        role: 'compliance',
        yards: [TAMARACK_DRAW],
      },
      {
        name: 'Wade Tillery',
        email: 'wade@greasewood.example',
        licence: null,
        role: 'yard-manager',
        yards: [TAMARACK_DRAW],
      },
      {
        name: 'Ingrid Mosely',
        email: 'ingrid@greasewood.example',
        licence: null,
        role: 'administrator',
        yards: [],
      },
    ],
  },
  {
    name: 'Saltgrass Feeding Group',
    yards: [
      {
        name: ALKALI_BENCH,
        timeZone: 'America/Denver',
        advisoryEmail: 'office@alkali-bench.example',
        capNitrogenKgPerHead: null,
        capPhosphorusKgPerHead: null,
      },
    ],
    members: [
      {
        name: 'Petra Lundgren',
        email: 'petra@saltgrass.example',
        licence: null,
        role: 'nutritionist',
        yards: [ALKALI_BENCH],
      },
      { ...rosa, yards: [ALKALI_BENCH] },
    ],
  },
];

/** The people of the demo, each once, with the role they sign in with. */
export function demoSignIns(): { name: string; role: Role; email: string }[] {
  const members = demoFirms.flatMap((firm) => firm.members);
  const first = members.filter(({ email }, index) => members.findIndex((other) => other.email === email) === index);
  return first.map(({ name, role, email }) => ({ name, role, email }));
}
