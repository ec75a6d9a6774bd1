import { renderToStaticMarkup } from 'react-dom/server';
import { describe, expect, it } from 'vitest';
import { Num } from '@/app/_components/num';

describe('a figure in cells', () => {
  it('gives every digit a cell of one width and leaves signs alone', () => {
    const html = renderToStaticMarkup(<Num text="−10.4" />);
    expect(html.match(/inline-block/g)).toHaveLength(3);
  });

  it('is heard as one plain number', () => {
    const html = renderToStaticMarkup(<Num text="8.8" />);
    expect(html).toContain('<span class="sr-only">8.8</span>');
    expect(html).toContain('aria-hidden="true"');
  });
});
