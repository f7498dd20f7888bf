// names: wall, film
// complaint: the twin without the mistake does not compile
struct wall {};
struct film {};
void at(film);
void f() { at(wall{}); }
