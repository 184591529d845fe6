/** The id of the control that holds `lines.2.sharePctDm`; fields and error summaries agree on it. */
export const fieldId = (path: string): string => `field-${path.replaceAll('.', '-')}`;
