@echo off
rem Starts Ductledger; builds it first where there is no jar. Needs a JDK 17 or newer and, to build, mvn on the PATH.
rem After a change of the sources, delete server\target\ductledger.jar. DUCTLEDGER_JAVA_OPTS go to the JVM.
setlocal
set "HOME_DIR=%~dp0"
set "JAR=%HOME_DIR%target\ductledger.jar"
set "JAVA=java"
if defined JAVA_HOME set "JAVA=%JAVA_HOME%\bin\java"
"%JAVA%" -version >nul 2>&1
if errorlevel 1 (
    echo ductledger: a JDK 17 or newer is required: there is no java on the PATH, or none where JAVA_HOME points 1>&2
    exit /b 2
)
if exist "%JAR%" goto run
where mvn >nul 2>&1
if errorlevel 1 (
    echo ductledger: Maven is required to build the program, and mvn is not on the PATH 1>&2
    exit /b 2
)
echo ductledger: building the program; this takes a moment, once 1>&2
pushd "%HOME_DIR%.."
call mvn -q -B -ntp -pl server -am package -DskipTests 1>&2
set "BUILT=%ERRORLEVEL%"
popd
if not "%BUILT%"=="0" exit /b 4
:run
"%JAVA%" %DUCTLEDGER_JAVA_OPTS% -jar "%JAR%" %*
exit /b %ERRORLEVEL%
