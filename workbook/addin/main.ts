/** What Excel loads: the cell functions at once, the pane when Office is ready; one runtime for both. */
import { sharingCaller } from '../../functions/caller';
import { workerWork } from '../../functions/longWork';
import { associateAll, keepLoadedWithWorkbook } from '../../functions/runtime';
import { blanksIn, excelPort } from '../../taskpane/excel';
import { supportOf } from '../../taskpane/excel/support';
import { officeIsDark } from '../../taskpane/excel/theme';
import { h } from '../../taskpane/h';
import { hostName, notice } from '../../taskpane/host';
import { longWorkBar } from '../../taskpane/longWorkBar';
import { mountPane } from '../../taskpane/pane';
import '../../taskpane/pane.css';
import { startWorker } from '../../taskpane/startWorker';
import { followTheme } from '../../taskpane/theme';
import { copyOnWorker } from '../copying/copyOnWorker';
import './taskpane.css';

// not inside onReady: a workbook may calculate before the pane is shown
associateAll(globalThis, {
  blanksIn: async (address) => {
    await Office.onReady();
    return blanksIn(address);
  },
  caller: sharingCaller(workerWork(startWorker, longWorkBar(document.getElementById('long-work')!))),
});

async function start(root: HTMLElement): Promise<void> {
  if (typeof Office === 'undefined') {
    root.replaceChildren(
      h('p', {}, 'Office.js could not be loaded: check the connection, then reopen this pane.'),
    );
    return;
  }
  await Office.onReady();
  followTheme(undefined, officeIsDark);
  const host = hostName();
  if (host === null) {
    root.replaceChildren(h('p', {}, 'Flaskpace works inside Excel: open it from the Home tab there.'));
    return;
  }
  mountPane(root, excelPort(supportOf(host)), {
    makeCopy: copyOnWorker,
    notify: (words, tone) => tone === 'bad' && notice(words),
  });
  await keepLoadedWithWorkbook(globalThis);
}

void start(document.getElementById('pane')!);
