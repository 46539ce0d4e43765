export * from '@preact/signals-core';
