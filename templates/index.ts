import type { Template } from '../shared/template/template';
import { steppedShaft } from './stepped-shaft';
import { taperedHandle } from './tapered-handle';

/** Every built-in family, in the order the template list shows them. */
export const templates: readonly Template[] = [steppedShaft, taperedHandle];

export function templateById(id: string): Template | undefined {
  return templates.find((template) => template.id === id);
}
