import { materialById, MATERIALS } from '../standards/materials';
import { formatThread, parseThread } from '../standards/threads';
import { classSide } from '../standards/threads/limits';
import { parseAngle } from '../units/angle';
import { parseLength, type LengthUnit } from '../units/length';
import { plainCharacters, quoteGiven, type Parsed } from '../units/parsed';
import { parseFitOrTolerance, splitSizeAndTolerance, type Tolerance } from '../units/tolerance';
import { refuseCharacters } from './repertoire';
import type { EvaluatedValue, ParameterBase } from './template';
import { labelInSentence } from './words';

/** Longest text of a title or note, and of anything else that is typed into one field. */
export const MAX_TEXT = 80;

export type ReadValue = Parsed<EvaluatedValue>;

const refuse = (message: string): { ok: false; message: string } => ({ ok: false, message });

/** Empty, `none` and 0 all mean that an optional parameter is not set. */
export function isUnset(text: string): boolean {
  const plain = text.trim().toLowerCase();
  return plain === '' || plain === 'none' || plain === '0';
}

/** A tolerance in one canonical wording, '' for the general one, so that two can be compared. */
export function toleranceKey(tolerance: Tolerance | undefined): string {
  if (!tolerance || tolerance.kind === 'none') return '';
  if (tolerance.kind === 'fit') return tolerance.code;
  return tolerance.kind === 'symmetric' ? `±${tolerance.upper}` : `${tolerance.upper}/${tolerance.lower}`;
}

/**
 * Reads one typed text by its parameter's kind. Ranges are judged later, when other parameters are known.
 * @param text already bounded in length
 */
export function readValue(parameter: ParameterBase, text: string, entryUnit: LengthUnit): ReadValue {
  if (parameter.kind === 'text') return readText(parameter, text);
  if (text.trim() === '') {
    return parameter.optional ? { ok: true, value: { text, value: null } } : refuse(missing(parameter));
  }
  switch (parameter.kind) {
    case 'length':
    case 'diameter':
      return readSize(parameter, text, entryUnit);
    case 'angle': {
      if (parameter.optional && isUnset(text)) return unset(text);
      const angle = parseAngle(text);
      return angle.ok ? { ok: true, value: { text, unit: 'deg', value: angle.value } } : angle;
    }
    case 'ratio':
      return readRatio(parameter, text);
    case 'count':
      return readCount(parameter, text);
    case 'choice':
      return readChoice(parameter, text);
    case 'yes-no':
      return readYesNo(text);
    case 'thread': {
      if (isUnset(text)) return parameter.optional ? unset(text) : refuse(missing(parameter));
      const thread = parseThread(text);
      if (!thread.ok) return thread;
      if (classSide(thread.value) === 'internal') {
        return refuse(
          `${quoteGiven(text)} has the class of a tapped hole. This thread is outside: give 6g, 2A or no class.`,
        );
      }
      return { ok: true, value: { text, unit: 'none', value: formatThread(thread.value) } };
    }
    case 'fit': {
      const tolerance = parseFitOrTolerance(text, entryUnit);
      if (!tolerance.ok) return tolerance;
      const key = toleranceKey(tolerance.value);
      return {
        ok: true,
        value: { text, unit: 'none', value: key === '' ? null : key, tolerance: tolerance.value },
      };
    }
    case 'material':
      return readMaterial(text);
    case 'table':
      return refuse('A table is given as rows.');
  }
}

function unset(text: string): ReadValue {
  return { ok: true, value: { text, value: null } };
}

function missing(parameter: ParameterBase): string {
  const examples: Partial<Record<ParameterBase['kind'], string>> = {
    length: 'such as 12, 12 mm or 1/2 in',
    diameter: 'such as 25, 25 h6 or 3/4 in',
    thread: 'such as M10 or 3/8-16 UNC',
    count: 'as a whole number',
  };
  const how = examples[parameter.kind];
  return `The ${labelInSentence(parameter.label)} is empty. Give it${how ? `, ${how}` : ''}.`;
}

/** `25e8` is a fit to a fitter and a power of ten to a computer. */
const GLUED_E = /^\s*([\d.,]+)(e\d{1,2})\s*$/i;

function readSize(parameter: ParameterBase, text: string, entryUnit: LengthUnit): ReadValue {
  if (isUnset(text) && parameter.optional) return { ok: true, value: { text, unit: entryUnit, value: 0 } };
  const plain = parameter.kind === 'diameter' ? text.replace(/^\s*[Øø⌀]\s*/, '') : text;
  const glued = GLUED_E.exec(plain);
  if (glued && parameter.kind === 'diameter') {
    return refuse(
      `${quoteGiven(text)} can be read two ways. Type ${glued[1]} ${glued[2]} for the fit, or the figure without an exponent.`,
    );
  }
  const parts = glued ? { size: plain, tolerance: '' } : splitSizeAndTolerance(plain);
  const size = parseLength(parts.size, entryUnit);
  if (!size.ok) return size;
  if (size.value === 0 && !parameter.optional) {
    return refuse(`The ${labelInSentence(parameter.label)} cannot be 0. Give a size above 0.`);
  }
  const value: EvaluatedValue = { text, unit: size.unit, value: size.value };
  if (parts.tolerance === '') return { ok: true, value };
  const tolerance = parseFitOrTolerance(parts.tolerance, size.unit);
  if (!tolerance.ok) return tolerance;
  if (size.value === 0)
    return refuse(`${quoteGiven(text)} gives a tolerance to nothing. Leave the tolerance out.`);
  return { ok: true, value: { ...value, tolerance: tolerance.value } };
}

function readRatio(parameter: ParameterBase, text: string): ReadValue {
  if (parameter.optional && isUnset(text)) return unset(text);
  const found = /^(\d{1,6}(?:\.\d{1,6})?)(?: ?: ?(\d{1,6}(?:\.\d{1,6})?))?$/.exec(plainCharacters(text));
  const ratio = found ? Number(found[1]) / Number(found[2] ?? '1') : Number.NaN;
  if (!Number.isFinite(ratio) || ratio <= 0) {
    return refuse(`${quoteGiven(text)} is not a ratio. Type it as 1:20 or 0.05.`);
  }
  return { ok: true, value: { text, unit: 'none', value: ratio } };
}

function readCount(parameter: ParameterBase, text: string): ReadValue {
  const plain = plainCharacters(text);
  if (parameter.optional && isUnset(plain)) return unset(text);
  if (!/^\d{1,9}$/.test(plain)) {
    return refuse(
      `${quoteGiven(text)} is not a count. Give the ${labelInSentence(parameter.label)} as a whole number, such as 1 or 12.`,
    );
  }
  return { ok: true, value: { text, unit: 'none', value: Number(plain) } };
}

function readChoice(parameter: ParameterBase, text: string): ReadValue {
  const given = text.trim().toLowerCase();
  const choice = parameter.choices?.find(({ id, label }) => id === given || label.toLowerCase() === given);
  if (!choice) {
    const open = (parameter.choices ?? []).filter(({ notYet }) => notYet === undefined).map(({ id }) => id);
    return refuse(
      `${quoteGiven(text)} is not a choice for the ${labelInSentence(parameter.label)}. Choose ${open.join(' or ')}.`,
    );
  }
  return choice.notYet === undefined
    ? { ok: true, value: { text, unit: 'none', value: choice.id } }
    : refuse(choice.notYet);
}

function readYesNo(text: string): ReadValue {
  const given = text.trim().toLowerCase();
  if (['yes', 'y', 'true', '1'].includes(given))
    return { ok: true, value: { text, unit: 'none', value: true } };
  if (['no', 'n', 'false', '0', 'none'].includes(given))
    return { ok: true, value: { text, unit: 'none', value: false } };
  return refuse(`${quoteGiven(text)} is neither yes nor no. Type yes or no.`);
}

function readText(parameter: ParameterBase, text: string): ReadValue {
  const value = text.normalize('NFC').trim();
  const refusal = refuseCharacters(value);
  if (refusal) return refuse(refusal);
  if (value === '' && !parameter.optional) return refuse(missing(parameter));
  return { ok: true, value: { text: value, unit: 'none', value: value === '' ? null : value } };
}

function readMaterial(text: string): ReadValue {
  const material = materialById(text.trim());
  if (!material) {
    return refuse(
      `${quoteGiven(text)} is not in the table of materials. Choose one from the list, such as ${MATERIALS.slice(
        0,
        3,
      )
        .map(({ id }) => id)
        .join(', ')}.`,
    );
  }
  return { ok: true, value: { text, unit: 'none', value: material.id } };
}
