import { useMemo } from 'react';

/**
 * A small picture whose SVG the engine made. It is taken in as a document of its own and then as nodes,
 * so that nothing in it can be anything but a drawing.
 */
export function DrawnPicture({
  svg,
  label,
  className,
}: {
  svg: string | null;
  label: string;
  className?: string;
}) {
  const markup = useMemo(() => (svg ? cleanSvg(svg, label) : null), [svg, label]);
  if (!markup)
    return (
      <span className={`picture empty ${className ?? ''}`} role="img" aria-label={`${label}: none yet`} />
    );
  return <span className={`picture ${className ?? ''}`} dangerouslySetInnerHTML={{ __html: markup }} />;
}

const KNOWN = new Set([
  'svg',
  'g',
  'line',
  'polyline',
  'polygon',
  'path',
  'circle',
  'rect',
  'text',
  'title',
  'desc',
]);

/** The SVG with only drawing elements and no handlers, named for a screen reader; null when it is no SVG. */
export function cleanSvg(svg: string, label: string): string | null {
  const parsed = new DOMParser().parseFromString(svg, 'image/svg+xml');
  const root = parsed.documentElement;
  if (root.localName !== 'svg') return null;
  for (const element of [...root.querySelectorAll('*')]) {
    if (!KNOWN.has(element.localName)) element.remove();
    else
      for (const { name } of [...element.attributes])
        if (/^on/i.test(name) || /href$/i.test(name) || name === 'style') element.removeAttribute(name);
  }
  for (const { name } of [...root.attributes]) if (/^on/i.test(name)) root.removeAttribute(name);
  root.setAttribute('role', 'img');
  root.setAttribute('aria-label', label);
  return new XMLSerializer().serializeToString(root);
}
