export * from 'htm/preact';
