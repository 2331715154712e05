/** Orders and temperatures: what a copy shows when an input turns bad, or good again. */
import { sweep } from './sweep/sweep';

sweep('order', 'temperature');
