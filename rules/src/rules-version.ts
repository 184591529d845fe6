/** Rises with every change of what a screening says; CHANGELOG.md tells which rations screen differently. */
export const RULES_VERSION = '1.0.0';
