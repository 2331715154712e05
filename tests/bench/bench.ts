/** `npm run bench`: how long things take, each beside a peer in the same run. */
import { benchFits } from './fits';
import { benchHandOver } from './handOver';

benchFits();
console.log('');
void benchHandOver();
