export * from 'uqr';
