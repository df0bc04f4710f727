export interface LetterJob {
  to: string;
  subject: string;
  text: string;
  /** The report of this order goes with it, on paper. */
  withReportOfOrder?: string;
  attachments?: { filename: string; contentType: string; base64: string }[];
}

/** Work promised inside a transaction and done outside it. Handlers may run twice and must not mind. */
export interface Jobs {
  'send-letter': LetterJob;
  'lapse-order': { orderId: string };
  'end-review': { orderId: string };
  'release-fee': { orderId: string };
  'refund-order': { orderId: string };
  'reconcile-payments': Record<string, never>;
}

export type JobKind = keyof Jobs;
export type Job = { [K in JobKind]: { kind: K; data: Jobs[K] } }[JobKind];
