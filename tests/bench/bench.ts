/** `npm run bench`: how long things take, each beside a peer in the same run. */
import { benchFits } from './fits';
import { benchHandOver } from './handOver';
import { benchSharing } from './sharing';

benchFits();
console.log('');
benchSharing();
console.log('');
void benchHandOver();
