import { queryOptions, useQuery } from '@tanstack/react-query';
import type { DrawingAnswer } from '../../../shared/api/drawings';
import { askJson } from '../../lib/api/client';
import { api } from '../../lib/paths';

export const drawingQuery = (shop: string, drawing: string) =>
  queryOptions({
    queryKey: ['drawing', shop, drawing],
    queryFn: () => askJson<DrawingAnswer>('GET', api.drawing(shop, drawing)),
  });

/** A drawing and its revisions, newest first. */
export const useDrawing = (shop: string, drawing: string) => useQuery(drawingQuery(shop, drawing));
