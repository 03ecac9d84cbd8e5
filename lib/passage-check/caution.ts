/** Stands beside every verdict: on screens, prints, mails and in the reply of the check. */
export const CAUTION =
  'An aid, not a permission. A static model: waves and handling are not in it. The skipper decides; local rules, ' +
  'notices to mariners and qualified advice come first. Sample charts are not for navigation.';

/** Raised whenever the same input may give another result; stored with every check. */
export const ENGINE_VERSION = '1.0.0';
