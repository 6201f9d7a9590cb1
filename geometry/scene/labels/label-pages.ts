import type { Scene } from '../display-list';
import { PageBuilder, PX_PER_INCH } from '../paper/page-builder';
import type { SheetPages } from '../paper/sheet-request';
import { drawLabel } from './draw-label';
import { labelFacts } from './label-facts';
import { labelGrid, usualGrid, type LabelGrid } from './label-grids';

/**
 * A label for each piece and each offcut that is kept, on a grid of labels from the chosen place on, or one a page. Pages
 * of labels carry no heading and no foot: nothing but labels is on them.
 */
export const labelPages: SheetPages = ({ plan, layout, head, paper, labels }) => {
  const facts = labelFacts(plan, layout, head.jobNumber);
  const choice = labels ?? { grid: usualGrid(paper), start: 1 };
  const grid = labelGrid(choice.grid);
  const each = grid.columns * grid.rows;
  const skip = Math.min(Math.max(1, Math.floor(choice.start)), each) - 1;
  const count = facts.length === 0 ? 0 : Math.ceil((skip + facts.length) / each);
  return Array.from({ length: count }, (_, number): Scene => {
    const page = new PageBuilder(grid.page);
    const first = number * each - skip;
    for (let cell = 0; cell < each; cell++) {
      const fact = facts[first + cell];
      if (fact) drawLabel(page, fact, { ...cellOf(grid, cell), head, id: `label ${first + cell + 1}` });
    }
    const shown = facts.slice(Math.max(0, first), first + each).map((fact) => fact.letter);
    const title = `Labels ${number + 1} of ${count}`;
    return page.scene(title, `${title}: ${shown.join(', ')}.`);
  });
};

/** px of a label on its page, counted along the rows. */
function cellOf(grid: LabelGrid, cell: number) {
  const [column, row] = [cell % grid.columns, Math.floor(cell / grid.columns)];
  return {
    left: (grid.left + column * grid.pitchX) * PX_PER_INCH,
    top: (grid.top + row * grid.pitchY) * PX_PER_INCH,
    width: grid.width * PX_PER_INCH,
    height: grid.height * PX_PER_INCH,
  };
}
