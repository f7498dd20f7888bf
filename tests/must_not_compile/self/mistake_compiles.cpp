// names: wall, film
// complaint: the mistake compiles
struct wall {};
void at(wall);
void f() { at(wall{}); }
