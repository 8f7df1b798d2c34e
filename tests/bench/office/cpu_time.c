/* cpu_time COMMAND...: runs a command and prints the processor seconds that it and its children took. */
#include <stdio.h>
#include <sys/resource.h>
#include <sys/wait.h>
#include <unistd.h>

static double seconds(struct timeval time)
{
    return (double)time.tv_sec + 1e-6 * (double)time.tv_usec;
}

int main(int count, char **argument)
{
    struct rusage used;
    int status = 1;
    pid_t child = count > 1 ? fork() : -1;
    if (child < 0)
        return 1;
    if (child == 0) {
        dup2(STDERR_FILENO, STDOUT_FILENO);
        execvp(argument[1], argument + 1);
        _exit(127);
    }
    if (waitpid(child, &status, 0) < 0 || !WIFEXITED(status) || getrusage(RUSAGE_CHILDREN, &used) != 0)
        return 1;
    printf("%.3f\n", seconds(used.ru_utime) + seconds(used.ru_stime));
    return WEXITSTATUS(status);
}
