import { SVG, type Svg } from '@svgdotjs/svg.js';
import { boxRound } from './box-round';
import { centredOn, moved, scaled, type ViewBox } from './view-box';

export interface SheetSize {
  id: string;
  balloon: number;
  /** What a screen reader says of it. */
  label: string;
}

export interface StageCalls {
  onLight: (sizeId: string | null) => void;
  /** Absent on a sheet that is only read. */
  onEdit?: (sizeId: string) => void;
  /** After every change of what is seen. */
  onMoved?: () => void;
}

export interface Marked {
  lit: ReadonlySet<string>;
  wrong: ReadonlySet<string>;
  /** Outline of the lit size on the part, in paper millimetres. */
  edges: readonly (readonly { x: number; y: number }[])[];
}

const STEP = 1.25;
const NUDGE = 0.1;

/** A sheet mounted in the page: closer, further, moved about, its sizes lit up. Nothing on it is drawn here but the marks of state. */
export class SheetStage {
  #svg: Svg | null = null;
  #text = '';
  #whole: ViewBox = { x: 0, y: 0, width: 297, height: 210 };
  #box: ViewBox = this.#whole;
  #dragged = false;
  readonly #ends = new AbortController();

  constructor(
    private readonly host: HTMLElement,
    private readonly calls: StageCalls,
  ) {
    const { signal } = this.#ends;
    host.addEventListener('wheel', (event) => this.#wheel(event), { passive: false, signal });
    host.addEventListener('pointerdown', (event) => this.#grab(event), { signal });
    host.addEventListener('keydown', (event) => this.#key(event), { signal });
    host.addEventListener('click', (event) => this.#click(event), { signal });
    host.addEventListener('pointerover', (event) => this.#point(event.target), { signal });
    host.addEventListener('pointerleave', () => calls.onLight(null), { signal });
    host.addEventListener('focusin', (event) => this.#point(event.target), { signal });
  }

  end(): void {
    this.#ends.abort();
    this.host.replaceChildren();
  }

  /** Puts another sheet in; what is seen stays when the paper is of the same size. */
  show(text: string, sizes: readonly SheetSize[], name: string): void {
    if (text !== this.#text) this.#mount(text);
    this.#text = text;
    this.#name(sizes, name);
  }

  #mount(text: string): void {
    const root = new DOMParser().parseFromString(text, 'image/svg+xml').documentElement;
    if (root.localName !== 'svg') return;
    const node = document.importNode(root, true);
    const svg = SVG(node) as Svg;
    const { x, y, width, height } = svg.viewbox();
    const whole = { x, y, width, height };
    const same = whole.width === this.#whole.width && whole.height === this.#whole.height && this.#svg;
    this.#whole = whole;
    if (!same) this.#box = whole;
    svg.attr({ width: null, height: null });
    const focused = this.#focusedSize();
    this.host.replaceChildren(node);
    this.#svg = svg;
    this.#look();
    if (focused) this.#group(focused)?.focus({ preventScroll: true });
  }

  /** Names sheet and sizes for a screen reader and puts the sizes in the order of their balloons. */
  #name(sizes: readonly SheetSize[], name: string): void {
    const node = this.#svg?.node;
    if (!node) return;
    node.setAttribute('role', 'group');
    node.setAttribute('aria-label', name);
    const focused = this.#focusedSize();
    for (const size of sizes) {
      const group = this.#group(size.id);
      if (!group) continue;
      group.setAttribute('aria-label', size.label);
      group.setAttribute('role', this.calls.onEdit ? 'button' : 'img');
      group.setAttribute('tabindex', size.balloon > 0 || this.calls.onEdit ? '0' : '-1');
      node.append(group);
    }
    if (focused) this.#group(focused)?.focus({ preventScroll: true });
  }

  #group(sizeId: string): SVGGElement | null {
    return this.host.querySelector<SVGGElement>(`g[data-role="dimension"][data-id="${CSS.escape(sizeId)}"]`);
  }

  #focusedSize(): string | null {
    const active = document.activeElement;
    return active && this.host.contains(active) ? (active.getAttribute('data-id') ?? null) : null;
  }

  mark({ lit, wrong, edges }: Marked): void {
    const svg = this.#svg;
    if (!svg) return;
    svg.find('.state-mark').forEach((each) => each.remove());
    for (const group of this.host.querySelectorAll<SVGGElement>('g[data-id]')) {
      const id = group.getAttribute('data-id') ?? '';
      group.classList.toggle('is-lit', lit.has(id));
      group.classList.toggle('is-wrong', wrong.has(id));
      if (group.getAttribute('data-role') !== 'dimension' || (!lit.has(id) && !wrong.has(id))) continue;
      boxRound(group, wrong.has(id) ? 'is-wrong' : 'is-lit');
    }
    for (const edge of edges)
      svg
        .polyline(edge.map(({ x, y }): [number, number] => [x, y]))
        .attr({ class: 'state-mark edge', fill: 'none', 'pointer-events': 'none' });
  }

  /** Where a size's text stands in the host, px; null when it is not on this sheet. */
  placeOf(sizeId: string): { left: number; top: number; width: number; height: number } | null {
    const group = this.#group(sizeId);
    const target = group?.querySelector('text') ?? group;
    if (!target) return null;
    const box = target.getBoundingClientRect();
    const host = this.host.getBoundingClientRect();
    return { left: box.left - host.left, top: box.top - host.top, width: box.width, height: box.height };
  }

  whole(): void {
    this.#box = this.#whole;
    this.#look();
  }

  closer(): void {
    this.#scale(STEP, this.#middle());
  }

  further(): void {
    this.#scale(1 / STEP, this.#middle());
  }

  /** Brings a size into the middle, at a width of paper in which it can be read. */
  bringIn(sizeId: string, width: number): void {
    const text = this.#group(sizeId)?.querySelector('text');
    if (!text) return;
    const point = { x: Number(text.getAttribute('x')), y: Number(text.getAttribute('y')) };
    const { clientWidth, clientHeight } = this.host;
    this.#box = centredOn(this.#whole, point, width, clientWidth / Math.max(1, clientHeight));
    this.#look();
  }

  #middle(): { x: number; y: number } {
    const { x, y, width, height } = this.#box;
    return { x: x + width / 2, y: y + height / 2 };
  }

  #scale(by: number, about: { x: number; y: number }): void {
    this.#box = scaled(this.#box, this.#whole, by, about);
    this.#look();
  }

  #move(dx: number, dy: number): void {
    this.#box = moved(this.#box, this.#whole, dx, dy);
    this.#look();
  }

  #look(): void {
    const { x, y, width, height } = this.#box;
    this.#svg?.viewbox(x, y, width, height);
    this.calls.onMoved?.();
  }

  #paperPerPixel(): number {
    const ctm = this.#svg?.node.getScreenCTM();
    return ctm && ctm.a > 0 ? 1 / ctm.a : this.#box.width / Math.max(1, this.host.clientWidth);
  }

  #wheel(event: WheelEvent): void {
    const ctm = this.#svg?.node.getScreenCTM();
    // The whole sheet cannot go further: the wheel then moves the page, as anywhere else.
    if (!ctm || (event.deltaY > 0 && this.#box.width >= this.#whole.width)) return;
    event.preventDefault();
    const point = new DOMPoint(event.clientX, event.clientY).matrixTransform(ctm.inverse());
    this.#scale(event.deltaY < 0 ? STEP : 1 / STEP, point);
  }

  #grab(event: PointerEvent): void {
    if (event.button !== 0) return;
    this.#dragged = false;
    let [x, y] = [event.clientX, event.clientY];
    const start = { x, y };
    const ends = new AbortController();
    const { signal } = ends;
    window.addEventListener(
      'pointermove',
      (move) => {
        if (Math.hypot(move.clientX - start.x, move.clientY - start.y) > 4) this.#dragged = true;
        if (!this.#dragged) return;
        const scale = this.#paperPerPixel();
        this.#move((x - move.clientX) * scale, (y - move.clientY) * scale);
        [x, y] = [move.clientX, move.clientY];
      },
      { signal },
    );
    window.addEventListener('pointerup', () => ends.abort(), { signal });
    window.addEventListener('pointercancel', () => ends.abort(), { signal });
  }

  #key(event: KeyboardEvent): void {
    if (event.ctrlKey || event.metaKey || event.altKey || event.target instanceof HTMLInputElement) return;
    const step = this.#box.width * NUDGE;
    const acts: Readonly<Record<string, () => void>> = {
      ArrowLeft: () => this.#move(-step, 0),
      ArrowRight: () => this.#move(step, 0),
      ArrowUp: () => this.#move(0, -step),
      ArrowDown: () => this.#move(0, step),
      '+': () => this.closer(),
      '=': () => this.closer(),
      '-': () => this.further(),
      '–': () => this.further(),
      '0': () => this.whole(),
    };
    const id = this.#sizeOf(event.target);
    if (id && this.calls.onEdit && ['Enter', 'F2', ' '].includes(event.key)) {
      event.preventDefault();
      this.calls.onEdit(id);
      return;
    }
    const act = acts[event.key];
    if (!act) return;
    event.preventDefault();
    act();
  }

  #click(event: MouseEvent): void {
    const id = this.#sizeOf(event.target);
    if (id && !this.#dragged) this.calls.onEdit?.(id);
  }

  #point(target: EventTarget | null): void {
    if (target instanceof SVGElement) this.calls.onLight(this.#sizeOf(target));
  }

  #sizeOf(target: EventTarget | null): string | null {
    if (!(target instanceof Element)) return null;
    return (
      target.closest('g[data-role="dimension"], g[data-role="balloon"]')?.getAttribute('data-id') ?? null
    );
  }
}
