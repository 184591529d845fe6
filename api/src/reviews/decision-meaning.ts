import type { Decision, SignerRole } from '@brimgate/rules';

const MEANINGS: Readonly<Record<SignerRole, Readonly<Record<Decision, string>>>> = {
  veterinarian: {
    concur: 'As veterinarian I have read the findings and concur with feeding this ration as it stands.',
    'concur-with-conditions':
      'As veterinarian I have read the findings and concur with feeding this ration under the conditions written here.',
    'send-back': 'As veterinarian I do not concur with feeding this ration as it stands.',
  },
  compliance: {
    concur: 'As compliance staff I have read the nutrient figures and concur with feeding this ration as it stands.',
    'concur-with-conditions':
      'As compliance staff I have read the nutrient figures and concur under the conditions written here.',
    'send-back': 'As compliance staff I do not concur with feeding this ration as it stands.',
  },
};

/** What a signature means, kept with it so that it reads the same for ever. */
export const meaningOf = (role: SignerRole, decision: Decision): string => MEANINGS[role][decision];
