-- What may be large is kept outside its row, so that lists stay quick.
create domain large_bytes as binary large object;
