/* An image that does nothing: what a function adds to it is its flash and its RAM. */
int main(void)
{
    return 0;
}
