import { describe, expect, it } from 'vitest';
import { svgText } from './svg-text';

describe('svgText', () => {
  it('makes a file that stands alone: namespace, size, and the colours the page gave', () => {
    document.body.innerHTML = `<style>.line { stroke: rgb(43, 74, 114); stroke-width: 2px }</style>
      <svg viewBox="0 0 10 10"><g><path class="line" d="M0 0h10"/></g><text>0.5 % &amp; more</text></svg>`;
    const text = svgText(document.querySelector('svg')!);
    const file = new DOMParser().parseFromString(text, 'image/svg+xml');
    expect(file.documentElement.namespaceURI).toBe('http://www.w3.org/2000/svg');
    expect(file.documentElement.hasAttribute('width')).toBe(true);
    expect(file.querySelector('path')?.getAttribute('stroke')).toBe('rgb(43, 74, 114)');
    expect(file.querySelector('path')?.getAttribute('stroke-width')).toBe('2px');
    expect(file.querySelector('text')?.textContent).toBe('0.5 % & more');
    expect(document.querySelector('path')?.hasAttribute('stroke')).toBe(false);
  });
});
