import type { Register } from '../../shared/route/register';

/** What the shop calls a machine or a thing of its register; the id itself when it is not there any more. */
export function itemName(register: Register | undefined, id: string): string {
  if (!register) return id;
  const { lathes, mills, saws, chucks, colletSets, colletBlocks, dividingHeads } = register;
  const items = [...lathes, ...mills, ...saws, ...chucks, ...colletSets, ...colletBlocks, ...dividingHeads];
  return items.find((item) => item.id === id)?.name ?? id;
}
