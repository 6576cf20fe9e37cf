import { DOMParser, type Element } from '@xmldom/xmldom';
import type { SvgElement } from '../../../shared/api/svg-contract';

/** An SVG text as the plain tree that the contract is written over. Malformed XML throws. */
export function svgTree(svg: string): SvgElement {
  const failOnAnything = (_level: string, message: string) => {
    throw new Error(message);
  };
  const document = new DOMParser({ onError: failOnAnything }).parseFromString(svg, 'image/svg+xml');
  if (!document.documentElement) throw new Error('The SVG has no root element.');
  return plain(document.documentElement);
}

function plain(element: Element): SvgElement {
  const children: SvgElement[] = [];
  let text = '';
  for (const node of Array.from(element.childNodes)) {
    if (node.nodeType === node.ELEMENT_NODE) children.push(plain(node as Element));
    else text += node.nodeValue ?? '';
  }
  const attributes = Object.fromEntries(
    Array.from(element.attributes).map(({ name, value }) => [name, value]),
  );
  return { tag: element.tagName, attributes, children, text };
}
