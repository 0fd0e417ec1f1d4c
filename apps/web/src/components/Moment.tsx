const zone = (): string => Intl.DateTimeFormat().resolvedOptions().timeZone;

const parts = new Intl.DateTimeFormat('sv-SE', { year: 'numeric', month: '2-digit', day: '2-digit', hour: '2-digit', minute: '2-digit' });

/** A time in the reader's zone, written ISO-like; the exact moment in the tooltip. */
export function Moment({ at }: { at: string }) {
  return <time className="figure" dateTime={at} title={`${at} (shown in ${zone()})`}>{parts.format(new Date(at))}</time>;
}

export function Day({ on }: { on: string }) {
  return <time className="figure" dateTime={on}>{on}</time>;
}
