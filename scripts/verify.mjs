import { launchApiProgram, pathArguments } from './workspace/launch.mjs';

await launchApiProgram('verify', pathArguments());
