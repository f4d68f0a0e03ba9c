import { exitWithFailure } from './failure.mjs';
import { runProduct } from './run-product.mjs';

await runProduct('dev').catch(exitWithFailure);
