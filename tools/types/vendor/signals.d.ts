export * from '@preact/signals';
