/** What a handler gives back; a handler that wrote its answer itself gives undefined. */
export interface Answer {
  readonly status: number;
  readonly body?: unknown;
  readonly headers?: Readonly<Record<string, string>>;
}
