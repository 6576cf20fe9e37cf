import { useQuery } from '@tanstack/react-query';
import { askEngine } from './engine-worker';

/** The profile of a family's worked example as SVG, drawn by the engine. */
export function useTemplatePicture(template: string): string | null {
  const { data } = useQuery({
    queryKey: ['template-picture', template],
    staleTime: Infinity,
    queryFn: async () => {
      const answer = await askEngine({ kind: 'picture', template });
      if (answer.kind !== 'picture') throw new Error('The engine drew no picture.');
      return answer.svg;
    },
  });
  return data ?? null;
}
