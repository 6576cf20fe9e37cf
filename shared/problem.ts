/**
 * What a person got wrong, said so that they can mend it. Collected, never thrown.
 * `path` names the parameter: `gripLength`, `steps[2].diameter`, `--scale`.
 */
export interface Problem {
  path: string;
  /** One or two plain sentences: what was given, what is allowed, what to do. */
  message: string;
}

/** A remark that refuses nothing; `code` is stable and may be matched on. */
export interface Advice {
  code: string;
  message: string;
  path?: string;
}
