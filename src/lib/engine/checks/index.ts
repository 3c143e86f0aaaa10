export { checkList } from './check-list';
export { checksOf } from './checks-of';
export { marginLedger, type MarginLedger, type MarginLine } from './margin-ledger';
export { NOT_SHOWN } from './not-shown';
export type { Finding } from './finding';
export type { CheckBasis, CheckResult, CheckThreshold } from './types';
