// names: film, wall, distant
// complaint: the message does not say 'distant'
struct wall {};
struct film {};
void at(film);
#ifdef TWIN
void f() { at(film{}); }
#else
void f() { at(wall{}); }  // distant
#endif
