// names: film, apple
// complaint: the message does not say 'apple'
struct wall {};
struct film {};
void at(film);
#ifdef TWIN
void f() { at(film{}); }
#else
void f() { at(wall{}); }
#endif
