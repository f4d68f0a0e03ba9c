import { exitWithFailure } from './failure.mjs';
import { runProduct } from './run-product.mjs';

await runProduct('start').catch(exitWithFailure);
