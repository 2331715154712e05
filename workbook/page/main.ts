/** The local workbook: a grid with every PACE function live, and the pane beside it. */
import { workerWork } from '../../functions/longWork';
import { h } from '../../taskpane/h';
import { longWorkBar } from '../../taskpane/longWorkBar';
import { mountPane } from '../../taskpane/pane';
import { startWorker } from '../../taskpane/startWorker';
import { followTheme } from '../../taskpane/theme';
import '../../taskpane/pane.css';
import { copyOnWorker } from '../copying/copyOnWorker';
import { demoWorkbook } from '../demo/demo';
import { createGrid } from '../engine/univer/grid';
import { localPort } from '../localPort';
import { followActiveCell } from './cellLine';
import { pageFiles } from './copies';
import { documentsOf, selectFirstNumber } from './documents';
import { fileFormat } from './fileFormat';
import './page.css';
import { moveBetween } from './regions';
import { offerToScripts } from './scripting';
import { fillStrip } from './strip';

const part = (id: string): HTMLElement => document.getElementById(id)!;

async function start(): Promise<void> {
  const isDark = followTheme((isDarkNow) => grid.setDark(isDarkNow));
  const gridElement = part('grid');
  gridElement.replaceChildren();
  const demo = demoWorkbook();
  const grid = createGrid(gridElement, demo, {
    isDark,
    longWork: workerWork(startWorker, longWorkBar(part('long-work'))),
  });

  const strip = fillStrip(part('strip'), {
    open: () => void documents.open(),
    saveAs: () => void documents.saveAs(),
    demo: () => void documents.demo(),
  });
  const documents = documentsOf(grid, fileFormat, demoWorkbook, strip);
  selectFirstNumber(grid, demo);

  followActiveCell(part('cell-line'), grid);
  const port = localPort(grid, pageFiles(documents));
  mountPane(part('pane'), port, { makeCopy: copyOnWorker });
  moveBetween([
    { element: strip.element },
    { element: part('sheet'), focus: () => grid.focus() },
    { element: part('pane') },
  ]);
  window.addEventListener('beforeunload', (event) => {
    if (documents.isUnsaved) event.preventDefault();
  });
  await grid.settled();
  offerToScripts(grid, port);
}

start().catch((error: unknown) => {
  const words = error instanceof Error ? error.message : String(error);
  part('grid').replaceChildren(
    h('p', { className: 'waiting', role: 'alert' }, `the sheet could not be shown: ${words}`),
  );
});
