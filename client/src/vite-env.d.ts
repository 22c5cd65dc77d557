import 'vite/client';
