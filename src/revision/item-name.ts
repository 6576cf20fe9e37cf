import type { Register } from '../../shared/route/register';

/** What sort of machine it is, in a word: `Lathe`, `Mill`, `Saw`; its id where the register has it no more. */
export function machineWord(register: Register | undefined, id: string): string {
  if (!register) return id;
  const has = (machines: readonly { id: string }[]) => machines.some((machine) => machine.id === id);
  if (has(register.lathes)) return 'Lathe';
  if (has(register.mills)) return 'Mill';
  return has(register.saws) ? 'Saw' : id;
}

/** What the shop calls a machine or a thing of its register; the id itself when it is not there any more. */
export function itemName(register: Register | undefined, id: string): string {
  if (!register) return id;
  const { lathes, mills, saws, chucks, colletSets, colletBlocks, dividingHeads } = register;
  const items = [...lathes, ...mills, ...saws, ...chucks, ...colletSets, ...colletBlocks, ...dividingHeads];
  return items.find((item) => item.id === id)?.name ?? id;
}
