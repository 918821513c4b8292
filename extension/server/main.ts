import { createConnection, ProposedFeatures } from 'vscode-languageserver/node';
import { analyse } from '../core/analyse.ts';
import { serve } from './serve.ts';

// The transport is named on the command line: `--stdio`, or `--node-ipc` where VS Code starts the server.
serve(createConnection(ProposedFeatures.all), analyse);
