import { useMemo } from 'react';
import type { Body } from '../../shared/part/body';
import type { SetUp } from '../../shared/route/route';
import { pairPicture, type PictureSize } from '../../shared/drawing/picture';
import { renderPicture } from '../../shared/render/svg';
import { DrawnPicture } from './drawn-picture';

interface SetUpPicturesProps {
  card: { before: Body; after: Body; setUp: SetUp; stops?: readonly { fromX: number; toX: number }[] };
  size?: PictureSize;
  label: string;
  className?: string;
}

/** The work before and after a set-up, one over the other on one datum, as it lies in the machine. */
export function SetUpPictures({ card, label, className, size }: SetUpPicturesProps) {
  const { before, after, setUp, stops } = card;
  const svg = useMemo(
    () => renderPicture(pairPicture(before, after, stops ? { ...setUp, stops } : setUp, size)),
    [before, after, setUp, stops, size],
  );
  return <DrawnPicture svg={svg} label={label} className={`set-up-pictures ${className ?? ''}`} />;
}
