import { refuseCharacters } from '../../shared/template/repertoire';
import { Refusal } from '../errors';

/** Lets pass only what the sheet's face can letter. @throws Refusal `bad-input` at that path, naming the character. */
export function requirePrintable(path: string, text: string): void {
  const message = refuseCharacters(text);
  if (message !== undefined) throw new Refusal('bad-input', [{ path, message }]);
}
