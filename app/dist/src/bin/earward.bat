@echo off
rem Starts Earward from wherever it lies. JAVA_HOME and EARWARD_JAVA_OPTIONS are heeded.
setlocal
for %%I in ("%~dp0..") do set "EARWARD_HOME=%%~fI"
set "JAVA=java"
if defined JAVA_HOME set "JAVA=%JAVA_HOME%\bin\java"
set "JAR="
for %%I in ("%EARWARD_HOME%\lib\earward-command-*.jar") do set "JAR=%%~fI"
if not defined JAR (
  echo earward: "%EARWARD_HOME%\lib" lacks the program; unpack the archive again. 1>&2
  exit /b 3
)
set "TIER=-XX:TieredStopAtLevel=1"
if "%~1"=="" set "TIER=-XX:+TieredCompilation"
for %%C in (desktop batch faults diagnose) do if "%~1"=="%%C" set "TIER=-XX:+TieredCompilation"
"%JAVA%" %TIER% -XX:+UseSerialGC -Xshare:auto %EARWARD_JAVA_OPTIONS% "-Dearward.home=%EARWARD_HOME%" -jar "%JAR%" %*
exit /b %ERRORLEVEL%
