import { queryOptions, useQuery } from '@tanstack/react-query';
import { askText } from '../../lib/api/client';
import { api } from '../../lib/paths';

export const sheetSvgQuery = (shop: string, drawing: string, revision: string) =>
  queryOptions({
    queryKey: ['sheet-svg', shop, drawing, revision],
    queryFn: () => askText(api.sheetSvg(shop, drawing, revision), 'image/svg+xml'),
    staleTime: 0,
  });

/** The sheet as the server issues it, with its state across it. */
export const useSheetSvg = (shop: string, drawing: string, revision: string) =>
  useQuery(sheetSvgQuery(shop, drawing, revision));
