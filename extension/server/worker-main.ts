/// <reference lib="webworker" />
import { BrowserMessageReader, BrowserMessageWriter, createConnection } from 'vscode-languageserver/browser';
import { analyse } from '../core/analyse.ts';
import { serve } from './serve.ts';

// In a worker of a browser, where the client speaks by messages to the worker itself.
declare const self: DedicatedWorkerGlobalScope;

serve(createConnection(new BrowserMessageReader(self), new BrowserMessageWriter(self)), analyse);
