/** One line of a drawing; `look` decides ink and dash, `label` stands at its end. */
export interface TraceLine {
  points: readonly (readonly [x: number, y: number])[];
  look: 'force' | 'lead' | 'trail' | 'carry';
  label?: string;
}

/** A moment on the x axis. */
export interface TraceMark {
  at: number;
  label: string;
}

/** A curve with its moments, ready to be drawn. */
export interface Trace {
  says: string;
  xUnit: string;
  yUnit: string;
  lines: readonly TraceLine[];
  marks: readonly TraceMark[];
  /** x and y to one scale, as a flight is seen from the side. */
  trueShape?: boolean;
}
